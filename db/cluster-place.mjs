// Where a private PostgreSQL cluster may lie and which account runs it: PostgreSQL refuses to run as root.
import crypto from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'

import { Problem } from '../lib/machine/problem.mjs'

/** Reads /etc/passwd, because plain Node has no way to ask for another account. */
function readAccounts() {
  return fs
    .readFileSync('/etc/passwd', 'utf8')
    .split('\n')
    .map((line) => line.split(':'))
    .filter((fields) => fields.length >= 6)
    .map(([name, , uid, gid]) => ({ name, uid: Number(uid), gid: Number(gid) }))
}

const nameOf = (uid) => readAccounts().find((account) => account.uid === uid)?.name ?? `user ${uid}`

function mayPass(folder, { uid, gid }) {
  const stat = fs.statSync(folder)
  if (stat.uid === uid) return (stat.mode & 0o100) !== 0
  if (stat.gid === gid) return (stat.mode & 0o010) !== 0
  return (stat.mode & 0o001) !== 0
}

/** A home like /root is closed to the postgres account, so one folder up or down makes no difference. */
function mayReach(folder, owner) {
  for (let parent = path.dirname(folder); ; parent = path.dirname(parent)) {
    if (!mayPass(parent, owner)) return false
    if (parent === '/') return true
  }
}

/** A name in /var/tmp can be taken by anyone beforehand; then it is not ours to use. */
function placeOutside(folder) {
  const hash = crypto.createHash('sha256').update(folder).digest('hex').slice(0, 12)
  const parent = `/var/tmp/nightsheet-${hash}`
  fs.mkdirSync(parent, { recursive: true, mode: 0o711 })
  const stat = fs.lstatSync(parent)
  if (!stat.isDirectory() || stat.uid !== 0) throw new Problem(`${parent} belongs to ${nameOf(stat.uid)}: remove it.`)
  fs.chmodSync(parent, 0o711)
  return path.join(parent, path.basename(folder))
}

function ownerForRoot(folder) {
  const present = fs.existsSync(folder) ? fs.statSync(folder) : undefined
  if (present && present.uid !== 0) return { uid: present.uid, gid: present.gid }
  const postgres = readAccounts().find((account) => account.name === 'postgres')
  if (!postgres) throw new Problem('There is no account named postgres, which PostgreSQL would run as.')
  return { uid: postgres.uid, gid: postgres.gid }
}

/** Makes the data folder; others may pass through it (the postgres account has to), not look into it. */
export function makeDataFolder(folder) {
  const madeNow = fs.mkdirSync(folder, { recursive: true })
  if (madeNow) fs.chmodSync(folder, 0o711)
  const { uid } = fs.statSync(folder)
  const me = process.getuid()
  if (me !== 0 && uid !== me) {
    throw new Problem(`${folder} belongs to ${nameOf(uid)}: start as that user, or remove the folder and its data.`)
  }
}

/** @returns {{ folder: string, owner: { uid: number, gid: number } | undefined }} no owner: run as ourselves. */
export function findPlace(wanted) {
  makeDataFolder(path.dirname(wanted))
  if (process.getuid() === 0) {
    const owner = ownerForRoot(wanted)
    const folder = mayReach(wanted, owner) ? wanted : placeOutside(wanted)
    return { folder, owner: folder === wanted ? owner : ownerForRoot(folder) }
  }
  if (fs.existsSync(wanted) && fs.statSync(wanted).uid !== process.getuid()) {
    const name = nameOf(fs.statSync(wanted).uid)
    throw new Problem(
      `The database in ${wanted} belongs to ${name}: start as that user or as root, or remove the folder and its data.`,
    )
  }
  return { folder: wanted, owner: undefined }
}
