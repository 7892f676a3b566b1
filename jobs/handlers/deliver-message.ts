// One promised message.
import { deliverMessage } from '@/lib/services/deliveries'
import type { WorkerParts } from '../parts'

export async function deliverMessageJob(parts: WorkerParts, { messageId }: { messageId: string }): Promise<void> {
  await deliverMessage(parts, messageId)
}
