// Reads and parses a JSON body, and stops reading when it grows beyond what any of our forms can mean.
import type { z } from 'zod'
import { InvalidInputError } from '@/lib/errors'

export const BODY_LIMIT_BYTES = 64 * 1024

export class BodyTooLargeError extends Error {
  constructor() {
    super('That is more than this address takes (64 kB).')
    this.name = 'BodyTooLargeError'
  }
}

/** The body's bytes. @throws BodyTooLargeError without having kept more than the limit. */
export async function readBytes(request: Request): Promise<Uint8Array<ArrayBuffer>> {
  if (Number(request.headers.get('content-length') ?? 0) > BODY_LIMIT_BYTES) throw new BodyTooLargeError()
  const chunks: Uint8Array[] = []
  let size = 0
  const reader = request.body?.getReader()
  for (let part = await reader?.read(); part && !part.done; part = await reader?.read()) {
    size += part.value.byteLength
    if (size > BODY_LIMIT_BYTES) {
      await reader?.cancel()
      throw new BodyTooLargeError()
    }
    chunks.push(part.value)
  }
  return new Uint8Array(Buffer.concat(chunks))
}

/** @throws BodyTooLargeError, InvalidInputError when the body is no JSON, ZodError when it does not fit the schema. */
export async function readJson<S extends z.ZodType>(request: Request, schema: S): Promise<z.output<S>> {
  const text = new TextDecoder().decode(await readBytes(request))
  let body: unknown
  try {
    body = JSON.parse(text)
  } catch {
    throw new InvalidInputError('The body is not JSON.')
  }
  return schema.parse(body)
}
