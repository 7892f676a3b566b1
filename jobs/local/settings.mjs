// The settings of a local deployment: what the environment says, else the private database, the fakes and kept secrets.
import fs from 'node:fs'
import path from 'node:path'

import { pickPort } from '../../lib/machine/ports.mjs'
import { Problem } from '../../lib/machine/problem.mjs'

import { cleanEnvironment, dataFolder, projectFolder } from './project.mjs'
import { keepSecrets } from './secrets.mjs'

const DATABASE_TO_COME = 'postgres://127.0.0.1/to-come'

const USUAL_PORTS = {
  web: ['WEB_PORT', 3200],
  weather: ['FAKE_WEATHER_PORT', 3210],
  smtp: ['FAKE_SMTP_PORT', 3220],
  mail: ['FAKE_MAIL_PORT', 3221],
  push: ['FAKE_PUSH_PORT', 3230],
  pushPage: ['FAKE_PUSH_PAGE_PORT', 3231],
}

/** The usual port of each server, or what the environment says, or the next free one; `shift` moves the usual ones. */
export async function pickPorts({ shift = 0, environment = process.env } = {}) {
  const given = new Set()
  const ports = {}
  for (const [server, [setting, usual]] of Object.entries(USUAL_PORTS)) {
    const wanted = environment[setting] || usual + shift
    if (!/^\d{1,5}$/.test(wanted)) throw new Problem(`Settings: ${setting} must be a port number`)
    ports[server] = await pickPort(Number(wanted), given)
  }
  return ports
}

/** What fakes/start.ts reads (where to listen), and what the seed and the end-to-end tests read (where to ask). */
export function describeFakes(ports, caFile) {
  const addresses = {
    weather: `http://127.0.0.1:${ports.weather}`,
    smtp: `smtp://127.0.0.1:${ports.smtp}`,
    mailPage: `http://127.0.0.1:${ports.mail}`,
    push: `https://127.0.0.1:${ports.push}`,
    pushPage: `http://127.0.0.1:${ports.pushPage}`,
  }
  const environment = {
    FAKE_WEATHER_PORT: String(ports.weather),
    FAKE_SMTP_PORT: String(ports.smtp),
    FAKE_MAIL_PORT: String(ports.mail),
    FAKE_PUSH_PORT: String(ports.push),
    FAKE_PUSH_PAGE_PORT: String(ports.pushPage),
    FAKE_CA_FILE: caFile,
    FAKE_WEATHER_URL: addresses.weather,
    FAKE_MAIL_URL: addresses.mailPage,
    FAKE_PUSH_URL: addresses.pushPage,
  }
  const settings = {
    OPEN_METEO_URL: addresses.weather,
    SMTP_URL: addresses.smtp,
    PUSH_ORIGINS: addresses.push,
    PUSH_CA_FILE: caFile,
  }
  return { addresses, environment, settings }
}

/** The environment without any setting of ours, for runs that bring all of them. */
export function withoutSettings(environment) {
  const example = fs.readFileSync(path.join(projectFolder, '.env.example'), 'utf8')
  const names = new Set([...example.matchAll(/^#? ?([A-Z][A-Z0-9_]+)=/gm)].map(([, name]) => name))
  return Object.fromEntries(Object.entries(environment).filter(([name]) => !names.has(name)))
}

/** `defaults` beneath what the environment says; the two VAPID keys go together, and an empty setting counts as none. */
function combineSettings(defaults) {
  const present = Object.fromEntries(Object.entries(cleanEnvironment()).filter(([, value]) => value !== ''))
  const { VAPID_PUBLIC_KEY, VAPID_PRIVATE_KEY } = present
  const ownKeys = (VAPID_PUBLIC_KEY ?? VAPID_PRIVATE_KEY) ? { VAPID_PUBLIC_KEY, VAPID_PRIVATE_KEY } : {}
  const settings = { ...defaults, ...present, ...ownKeys }
  // next-auth reads its address from the environment by itself.
  return { ...settings, NEXTAUTH_URL: settings.PUBLIC_URL }
}

/** @throws Problem with one line that names what is missing or malformed, before anything has started. */
export async function checkSettings({ settings, hasOwnDatabase }) {
  const { tsImport } = await import('tsx/esm/api')
  const { parseEnvironment } = await tsImport('../../lib/env.ts', import.meta.url)
  try {
    parseEnvironment(hasOwnDatabase ? { ...settings, DATABASE_URL: DATABASE_TO_COME } : settings)
  } catch (error) {
    throw new Problem(error.message)
  }
}

/** What `npm start` is to run, on ports that are free now. With DEMO=0 nothing stands in: every setting has to come from the environment. */
export async function planStart() {
  const isDemo = process.env.DEMO !== '0'
  const ports = await pickPorts()
  const fakes = describeFakes(ports, path.join(dataFolder, 'fakes', 'authority.pem'))
  const standIns = () => ({ PUBLIC_URL: `http://localhost:${ports.web}`, ...fakes.settings, ...keepSecrets() })
  const settings = combineSettings(isDemo ? standIns() : {})
  const hasOwnDatabase = isDemo && settings.DATABASE_URL === undefined
  return {
    settings,
    ports,
    host: process.env.WEB_HOST || '127.0.0.1',
    isDemo,
    hasOwnDatabase,
    // Demo people have known passwords: they get into somebody's own database only when DEMO=1 asks for them.
    wantsDemoData: hasOwnDatabase || process.env.DEMO === '1',
    addresses: fakes.addresses,
    fakeEnvironment: isDemo ? fakes.environment : {},
  }
}
