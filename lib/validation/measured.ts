// Reads the measured data and the oracle tables, where they are at hand.
import { existsSync, readFileSync } from 'node:fs'
import { resolve } from 'node:path'

/** Beside the project, not in it. */
const DATA_FOLDER = resolve(import.meta.dirname, '../../../shared/data')

/** True when the measured data are at hand. */
export function hasMeasuredData(): boolean {
  return existsSync(DATA_FOLDER)
}

/** Rows of a table of numbers and texts, by column name. */
export function readTable(path: string): Record<string, string>[] {
  const [head, ...lines] = readFileSync(resolve(DATA_FOLDER, path), 'utf8').trim().split(/\r?\n/)
  const names = head!.split(',')
  return lines.map((line) => Object.fromEntries(line.split(',').map((value, index) => [names[index]!, value])))
}

/** A JSON document. */
export function readDocument<T>(path: string): T {
  return JSON.parse(readFileSync(resolve(DATA_FOLDER, path), 'utf8')) as T
}

/** A number, or null where the table is empty. */
export function numberOrNull(text: string | undefined): number | null {
  return text === undefined || text === '' ? null : Number(text)
}
