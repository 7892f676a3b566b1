// `npm run score`: one JSON document in (file argument or standard input), one out. No database, no network, no settings.
import { readFileSync } from 'node:fs'
import { judge } from '@/lib/advice/judge'
import type { Judgement } from '@/lib/advice/types'
import { parseScoreText, scoreFaults, scoreInputSchema } from '@/lib/schemas/score'
import { plainWords } from '@/lib/words/options'
import { reasonText } from '@/lib/words/reasons'

const BAD_DOCUMENT = 2

function readDocument(): unknown {
  const path = process.argv[2]
  const text = readFileSync(path === undefined || path === '-' ? 0 : path, 'utf8')
  return parseScoreText(text)
}

/** Every reason with its sentence beside the code. */
function withTexts(judgement: Judgement, timeZone: string) {
  const words = plainWords(timeZone)
  const hours = judgement.hours.map((hour) => ({
    ...hour,
    reasons: hour.reasons.map(({ code, factor, values }) => ({
      code,
      text: reasonText({ code, values }, words),
      factor,
      values,
    })),
  }))
  return { ...judgement, hours }
}

function refuse(faults: string[]): void {
  process.stderr.write(faults.map((fault) => `${fault}\n`).join(''))
  process.exitCode = BAD_DOCUMENT
}

function main(): void {
  let document: unknown
  try {
    document = readDocument()
  } catch (error) {
    refuse([`(document): expected one JSON document, ${error instanceof Error ? error.message : String(error)}`])
    return
  }
  const input = scoreInputSchema.safeParse(document)
  if (!input.success) {
    refuse(scoreFaults(input.error))
    return
  }
  const judgement = judge(input.data)
  process.stdout.write(`${JSON.stringify(withTexts(judgement, input.data.rink.timeZone), null, 2)}\n`)
}

main()
