// A trouble that the person at the terminal can mend: shown as one plain line, without a stack.

export class Problem extends Error {
  /** `logFile` is shown by its last lines beneath the message. */
  constructor(message, { logFile } = {}) {
    super(message)
    this.name = 'Problem'
    this.logFile = logFile
  }
}
