// How a button sends the form without script: what is typed goes into the address, and nothing is kept.
export const BY_ADDRESS = {
  formAction: '?',
  formMethod: 'get',
  formEncType: 'application/x-www-form-urlencoded',
} as const
