// The production build, made again when something it is made of has changed.
import crypto from 'node:crypto'
import fs from 'node:fs'
import path from 'node:path'

import { run } from '../../lib/machine/processes.mjs'

import { cleanEnvironment, inProject, projectFolder } from './project.mjs'

const SOURCES = [
  'app',
  'components',
  'lib',
  'db',
  'public',
  'next.config.mjs',
  'postcss.config.mjs',
  'tailwind.config.ts',
  'tsconfig.json',
  'proxy.ts',
  'instrumentation.ts',
  'package-lock.json',
]

function listFiles(name) {
  const full = path.join(projectFolder, name)
  if (!fs.existsSync(full)) return []
  if (!fs.statSync(full).isDirectory()) return [name]
  return fs
    .readdirSync(full)
    .sort()
    .flatMap((entry) => listFiles(path.join(name, entry)))
}

function hashSources() {
  const hash = crypto.createHash('sha256').update(process.version)
  for (const name of SOURCES.flatMap(listFiles)) {
    hash.update(`\0${name}\0`).update(fs.readFileSync(path.join(projectFolder, name)))
  }
  return hash.digest('hex')
}

/** Builds into `distFolder` unless it already holds what the sources make. */
export async function ensureBuild(distFolder, note) {
  // Inside the build, so that it goes when that goes; a build that fails has none.
  const marker = path.join(projectFolder, distFolder, 'nightsheet-source-hash')
  const wanted = hashSources()
  if (fs.existsSync(marker) && fs.readFileSync(marker, 'utf8') === wanted) return note('up to date')
  fs.rmSync(marker, { force: true })
  const next = path.join(projectFolder, 'node_modules/next/dist/bin/next')
  const buildEnv = {
    ...cleanEnvironment(),
    NODE_ENV: 'production',
    NEXT_DIST_DIR: distFolder,
    NEXT_TELEMETRY_DISABLED: '1',
  }
  await run('next build', process.execPath, [next, 'build'], inProject(`build${distFolder}`, buildEnv))
  return fs.writeFileSync(marker, wanted)
}
