// How short a password may be: apart from the schemas, so that the browser's forms load none of them for one number.

export const MIN_PASSWORD_LENGTH = 10
