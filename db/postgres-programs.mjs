// PostgreSQL's programs on this machine: found where Debian puts them, installed when there are none.
import fs from 'node:fs'
import path from 'node:path'

import { installDebianPackages } from '../lib/machine/debian-packages.mjs'
import { Problem } from '../lib/machine/problem.mjs'

const DEBIAN_FOLDER = '/usr/lib/postgresql'
// Debian's package would start a server of its own on 5432.
const NO_MAIN_CLUSTER =
  'mkdir -p /etc/postgresql-common/createcluster.d && ' +
  "echo 'create_main_cluster = false' > /etc/postgresql-common/createcluster.d/00-no-main-cluster.conf"

function installedVersions() {
  if (!fs.existsSync(DEBIAN_FOLDER)) return []
  return fs
    .readdirSync(DEBIAN_FOLDER)
    .filter((version) => fs.existsSync(path.join(DEBIAN_FOLDER, version, 'bin', 'initdb')))
    .sort((a, b) => Number(b) - Number(a))
}

/** The version that made the cluster, else the newest: data files of one major version mean nothing to another. */
export function programFolder(cluster) {
  const versionFile = path.join(cluster, 'PG_VERSION')
  const made = fs.existsSync(versionFile) ? fs.readFileSync(versionFile, 'utf8').trim() : undefined
  const version = made ?? installedVersions()[0]
  if (!installedVersions().includes(version)) {
    throw new Problem(
      `${cluster} was made by PostgreSQL ${made}, which is gone. Install postgresql-${made}, or remove the folder.`,
    )
  }
  return path.join(DEBIAN_FOLDER, version, 'bin')
}

/** Nothing from outside: PG*, LC_* and LANG would change what initdb, the server and psql do. */
export function programEnvironment(extra = {}) {
  return { PATH: '/usr/bin:/bin', LC_ALL: 'C.UTF-8', TZ: 'UTC', ...extra }
}

/** Installs Debian's package when no server program is there. Says whether it had to. */
export async function ensurePostgresInstalled(logFolder) {
  if (installedVersions().length > 0) return false
  await installDebianPackages(['postgresql'], { logFolder, beforehand: NO_MAIN_CLUSTER })
  return true
}
