// What the terminal says once everything runs: where to go, as whom, and where messages can be read.
import fs from 'node:fs'

/** The sign-ins that db/seed.ts prints as one JSON array, each with its email, password and role or name. */
function readSignIns(seedLog) {
  const text = fs.existsSync(seedLog) ? fs.readFileSync(seedLog, 'utf8') : ''
  const line = text.split('\n').findLast((candidate) => candidate.startsWith('['))
  return line ? JSON.parse(line) : []
}

function table(rows) {
  const widths = rows[0].map((_, column) => Math.max(...rows.map((row) => row[column].length)))
  return rows.map(
    (row) =>
      `    ${row
        .map((cell, column) => cell.padEnd(widths[column]))
        .join('  ')
        .trimEnd()}`,
  )
}

const signInRows = (signIns) => signIns.map((person) => Object.values(person).map(String))

/** Messages and weather that somebody else's servers take or give are named as such. */
function describeParts({ settings, addresses, isDemo }) {
  if (!isDemo) return []
  const isOurs = (setting, address) => settings[setting] === address
  return [
    ['Caught mail', isOurs('SMTP_URL', addresses.smtp) ? addresses.mailPage : 'none: SMTP_URL points elsewhere'],
    ['Caught pushes', addresses.pushPage],
    [
      'Weather',
      isOurs('OPEN_METEO_URL', addresses.weather) ? `made up, ${addresses.weather}` : settings.OPEN_METEO_URL,
    ],
  ]
}

/** The lines to print. */
export function welcome({ settings, addresses, isDemo, wantsDemoData, seedLog, seconds }) {
  const signIns = wantsDemoData ? signInRows(readSignIns(seedLog)) : []
  const places = [['Nightsheet', settings.PUBLIC_URL], ...describeParts({ settings, addresses, isDemo })]
  return [
    '',
    `  Nightsheet runs. It took ${seconds}.`,
    '',
    ...table(places),
    ...(signIns.length > 0 ? ['', '  Sign in as', ...table(signIns)] : []),
    '',
    '  Ctrl-C stops everything. Logs are in .data/logs.',
    '',
  ].join('\n')
}
