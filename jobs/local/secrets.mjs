// Secrets of a local deployment: made once, kept in .data/settings.json for our own account only.
import crypto from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'

import { Problem } from '../../lib/machine/problem.mjs'

import { dataFolder } from './project.mjs'

const file = path.join(dataFolder, 'settings.json')

/** VAPID keys are a P-256 pair: the uncompressed point and the scalar, base64url (RFC 8292 section 3.2). */
export function makeSecrets() {
  const { privateKey } = crypto.generateKeyPairSync('ec', { namedCurve: 'P-256' })
  const { x, y, d } = privateKey.export({ format: 'jwk' })
  const point = Buffer.concat([Buffer.from([4]), Buffer.from(x, 'base64url'), Buffer.from(y, 'base64url')])
  return {
    NEXTAUTH_SECRET: crypto.randomBytes(32).toString('base64url'),
    VAPID_PUBLIC_KEY: point.toString('base64url'),
    VAPID_PRIVATE_KEY: d,
  }
}

/** The kept secrets; the first call makes them. */
export function keepSecrets() {
  if (!fs.existsSync(file)) {
    fs.writeFileSync(`${file}.new`, JSON.stringify(makeSecrets(), null, 2), { mode: 0o600 })
    fs.renameSync(`${file}.new`, file)
  }
  try {
    return JSON.parse(fs.readFileSync(file, 'utf8'))
  } catch (error) {
    throw new Problem(`${file} cannot be read (${error.message}): mend it, or remove it to get new secrets.`)
  }
}
