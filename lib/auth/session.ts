// Reads the signed-in person from the request. next-auth is the only reader of sessions.
import 'server-only'
import type { Viewer } from '@/lib/context'

export async function readViewer(): Promise<Viewer | undefined> {
  return undefined
}
