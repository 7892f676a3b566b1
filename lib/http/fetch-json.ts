// Reads our own route handlers from the browser: the body, or an error that carries the status.

export class FetchJsonError extends Error {
  constructor(
    readonly status: number,
    message: string,
  ) {
    super(message)
    this.name = 'FetchJsonError'
  }
}

interface Refusal {
  error?: { message?: string }
}

/** @throws FetchJsonError for every answer but 2xx; TypeError when there is no answer. */
export async function fetchJson<T>(address: string): Promise<T> {
  const response = await fetch(address, { headers: { Accept: 'application/json' }, cache: 'no-store' })
  if (response.ok) return (await response.json()) as T
  const refusal = (await response.json().catch(() => ({}))) as Refusal
  throw new FetchJsonError(response.status, refusal.error?.message ?? 'The server did not answer as it should.')
}
