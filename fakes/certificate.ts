// A certificate authority and one leaf for 127.0.0.1, made with node:crypto alone (X.509 v3, RFC 5280).
import { createHash, generateKeyPairSync, randomBytes, sign } from 'node:crypto'
import type { KeyObject } from 'node:crypto'

export interface LoopbackCertificate {
  /** The authority, for clients to trust. */
  caPem: string
  /** The leaf and its key, for the server. */
  certPem: string
  keyPem: string
}

const OID = {
  ecdsaWithSha256: '1.2.840.10045.4.3.2',
  commonName: '2.5.4.3',
  basicConstraints: '2.5.29.19',
  keyUsage: '2.5.29.15',
  extendedKeyUsage: '2.5.29.37',
  subjectAltName: '2.5.29.17',
  subjectKeyIdentifier: '2.5.29.14',
  authorityKeyIdentifier: '2.5.29.35',
  serverAuth: '1.3.6.1.5.5.7.3.1',
}

const CA_NAME = 'Nightsheet local authority'
const DAY_MILLIS = 24 * 3600 * 1000

/** Key usage as bit strings: the count of unused bits, then bit 5 or bit 0. */
const KEY_CERT_SIGN = Buffer.from([0x03, 2, 2, 0x04])
const DIGITAL_SIGNATURE = Buffer.from([0x03, 2, 7, 0x80])

/** Valid from a day ago for a year; a new authority each time, whose key is thrown away. */
export function createLoopbackCertificate(now: Date): LoopbackCertificate {
  const authority = generateKeyPairSync('ec', { namedCurve: 'P-256' })
  const leaf = generateKeyPairSync('ec', { namedCurve: 'P-256' })
  const issue = (subject: string, publicKey: KeyObject, extensions: Buffer[]) =>
    signCertificate({ subject, issuer: CA_NAME, publicKey, extensions, now }, authority.privateKey)

  const ca = issue(CA_NAME, authority.publicKey, [
    extension(OID.basicConstraints, sequence(boolean(true)), boolean(true)),
    extension(OID.keyUsage, KEY_CERT_SIGN, boolean(true)),
    extension(OID.subjectKeyIdentifier, tagged(0x04, keyIdentifier(authority.publicKey))),
  ])
  const server = issue('127.0.0.1', leaf.publicKey, [
    extension(OID.keyUsage, DIGITAL_SIGNATURE, boolean(true)),
    extension(OID.extendedKeyUsage, sequence(objectId(OID.serverAuth))),
    extension(
      OID.subjectAltName,
      sequence(tagged(0x87, Buffer.from([127, 0, 0, 1])), tagged(0x82, Buffer.from('localhost'))),
    ),
    extension(OID.authorityKeyIdentifier, sequence(tagged(0x80, keyIdentifier(authority.publicKey)))),
  ])
  return {
    caPem: toPem(ca),
    certPem: toPem(server),
    keyPem: leaf.privateKey.export({ type: 'pkcs8', format: 'pem' }).toString(),
  }
}

/** RFC 5280 section 4.2.1.2, method 1, over the whole key instead of its bare bits: any unique value will do. */
function keyIdentifier(publicKey: KeyObject): Buffer {
  return createHash('sha1')
    .update(publicKey.export({ type: 'spki', format: 'der' }))
    .digest()
}

interface CertificateBody {
  subject: string
  issuer: string
  publicKey: KeyObject
  extensions: Buffer[]
  now: Date
}

function signCertificate(
  { subject, issuer, publicKey, extensions, now }: CertificateBody,
  issuerKey: KeyObject,
): Buffer {
  const algorithm = sequence(objectId(OID.ecdsaWithSha256))
  const body = sequence(
    tagged(0xa0, integer(Buffer.from([2]))),
    integer(Buffer.concat([Buffer.of(1), randomBytes(15)])),
    algorithm,
    name(issuer),
    sequence(utcTime(now.getTime() - DAY_MILLIS), utcTime(now.getTime() + 365 * DAY_MILLIS)),
    name(subject),
    publicKey.export({ type: 'spki', format: 'der' }),
    tagged(0xa3, sequence(...extensions)),
  )
  return sequence(body, algorithm, tagged(0x03, Buffer.concat([Buffer.of(0), sign('sha256', body, issuerKey)])))
}

// DER, as far as a certificate needs it (X.690).

function tagged(tag: number, ...contents: Buffer[]): Buffer {
  const content = Buffer.concat(contents)
  const { length } = content
  const size = length < 0x80 ? [length] : length < 0x100 ? [0x81, length] : [0x82, length >> 8, length & 0xff]
  return Buffer.concat([Buffer.from([tag, ...size]), content])
}

const sequence = (...items: Buffer[]) => tagged(0x30, ...items)
const boolean = (value: boolean) => tagged(0x01, Buffer.of(value ? 0xff : 0))
/** A leading zero keeps a number with its top bit set positive. */
const integer = (bytes: Buffer) => tagged(0x02, (bytes[0] ?? 0) & 0x80 ? Buffer.concat([Buffer.of(0), bytes]) : bytes)
const name = (text: string) =>
  sequence(tagged(0x31, sequence(objectId(OID.commonName), tagged(0x0c, Buffer.from(text)))))
/** `critical` is left out when false, as DER does with every default. */
const extension = (oid: string, value: Buffer, ...critical: Buffer[]) =>
  sequence(objectId(oid), ...critical, tagged(0x04, value))

function utcTime(millis: number): Buffer {
  const digits = new Date(millis).toISOString().replace(/\D/g, '')
  return tagged(0x17, Buffer.from(`${digits.slice(2, 14)}Z`))
}

function objectId(dotted: string): Buffer {
  const [first = 0, second = 0, ...rest] = dotted.split('.').map(Number)
  return tagged(0x06, Buffer.from([first * 40 + second, ...rest.flatMap(base128)]))
}

/** Seven bits a byte, the highest bit set on all but the last. */
function base128(value: number): number[] {
  const bytes = [value & 0x7f]
  for (let rest = value >> 7; rest > 0; rest >>= 7) bytes.unshift((rest & 0x7f) | 0x80)
  return bytes
}

function toPem(der: Buffer): string {
  const lines = der.toString('base64').replace(/.{64}(?=.)/g, '$&\n')
  return `-----BEGIN CERTIFICATE-----\n${lines}\n-----END CERTIFICATE-----\n`
}
