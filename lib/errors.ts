// Errors a person may see. Services throw them; route(), formAction() and orNotFound() translate them, nobody else.

export type AppErrorCode =
  'invalid_input' | 'not_signed_in' | 'not_found' | 'forbidden' | 'conflict' | 'other_account' | 'rate_limited'

/** `message` is fit for the person; anything that is not an AppError is a bug and stays inside. */
export class AppError extends Error {
  constructor(
    readonly code: AppErrorCode,
    message: string,
    options?: ErrorOptions,
  ) {
    super(message, options)
    this.name = new.target.name
  }
}

/** `fields` maps a form field to what is wrong with it. */
export class InvalidInputError extends AppError {
  constructor(
    message: string,
    readonly fields: Record<string, string> = {},
  ) {
    super('invalid_input', message)
  }
}

export class NotSignedInError extends AppError {
  constructor() {
    super('not_signed_in', 'Sign in first.')
  }
}

export class NotFoundError extends AppError {
  constructor(what: string) {
    super('not_found', `${what} not found.`)
  }
}

export class ForbiddenError extends AppError {
  constructor() {
    super('forbidden', 'Your role on this rink does not allow that.')
  }
}

/** What a device kept for one account arrives while another is signed in there: to be sent again later, not refused. */
export class OtherAccountError extends AppError {
  constructor() {
    super('other_account', 'Somebody else is signed in here. Sign in as the person who entered this.')
  }
}

/** `latest` holds the fields that the form must send to overwrite deliberately. */
export class ConflictError extends AppError {
  constructor(
    message: string,
    readonly latest: Record<string, string> = {},
  ) {
    super('conflict', message)
  }
}

export class RateLimitedError extends AppError {
  constructor(readonly retryAfterSeconds: number) {
    super('rate_limited', `Too many tries. Try again in ${waitText(retryAfterSeconds)}.`)
  }
}

function waitText(seconds: number): string {
  const minutes = Math.ceil(seconds / 60)
  if (minutes > 60) return `${Math.ceil(minutes / 60)} hours`
  return minutes === 1 ? '1 minute' : `${minutes} minutes`
}
