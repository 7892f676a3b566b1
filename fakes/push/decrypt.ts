// Opens what a push service would hand to the browser: aes128gcm (RFC 8188) under the web push keys (RFC 8291).
import { createDecipheriv, hkdfSync } from 'node:crypto'
import type { ECDH } from 'node:crypto'

const TAG_BYTES = 16
const POINT_BYTES = 65
const LAST_RECORD = 2

/** The receiver's half: what a browser makes at subscribe and never gives away. */
export interface ReceiverKeys {
  ecdh: ECDH
  auth: Buffer
}

/** @throws Error when the header is malformed, the message is not for these keys, or it was tampered with. */
export function decryptPush(body: Buffer, { ecdh, auth }: ReceiverKeys): Buffer {
  const salt = body.subarray(0, 16)
  const recordSize = body.readUInt32BE(16)
  const keyIdLength = body.readUInt8(20)
  const senderKey = body.subarray(21, 21 + keyIdLength)
  const record = body.subarray(21 + keyIdLength)
  if (keyIdLength !== POINT_BYTES) throw new Error('the key id must be an uncompressed P-256 point')
  if (record.length > recordSize || record.length <= TAG_BYTES) throw new Error('a push message is exactly one record')

  const keyInfo = Buffer.concat([Buffer.from('WebPush: info\0'), ecdh.getPublicKey(), senderKey])
  const inputKey = derive(ecdh.computeSecret(senderKey), auth, keyInfo, 32)
  const contentKey = derive(inputKey, salt, Buffer.from('Content-Encoding: aes128gcm\0'), 16)
  const nonce = derive(inputKey, salt, Buffer.from('Content-Encoding: nonce\0'), 12)

  const decipher = createDecipheriv('aes-128-gcm', contentKey, nonce)
  decipher.setAuthTag(record.subarray(-TAG_BYTES))
  return stripPadding(Buffer.concat([decipher.update(record.subarray(0, -TAG_BYTES)), decipher.final()]))
}

function derive(key: Buffer, salt: Buffer, info: Buffer, length: number): Buffer {
  return Buffer.from(hkdfSync('sha256', key, salt, info, length))
}

/** The text ends at a delimiter that zeros may follow (RFC 8188 section 2). */
function stripPadding(padded: Buffer): Buffer {
  let end = padded.length - 1
  while (end >= 0 && padded[end] === 0) end -= 1
  if (padded[end] !== LAST_RECORD) throw new Error('the last record must end in its delimiter')
  return padded.subarray(0, end)
}
