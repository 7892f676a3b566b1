// The endpoints under /__fake/ by which tests and the page set the weather.
import type { IncomingMessage, ServerResponse } from 'node:http'
import { z } from 'zod'
import { answerJson, readBody } from '../http'
import { faultSchema } from './faults'
import { isScenarioName, SCENARIOS, type ScenarioName } from './scenarios'
import type { FakeState } from './state'

const coordinate = (most: number) => z.coerce.number().min(-most).max(most).optional()

const scenarioSchema = z
  .object({
    scenario: z.custom<ScenarioName>(isScenarioName, `one of ${Object.keys(SCENARIOS).join(', ')}`),
    latitude: coordinate(90),
    longitude: coordinate(180),
  })
  .refine((settings) => (settings.latitude === undefined) === (settings.longitude === undefined), {
    message: 'latitude and longitude go together',
  })

const clockSchema = z.object({ now: z.coerce.date().nullable() })

export async function answerControl(
  state: FakeState,
  path: string,
  request: IncomingMessage,
  response: ServerResponse,
): Promise<void> {
  const text = (await readBody(request)).toString('utf8')
  // By its first character: curl calls whatever it sends a form.
  const isForm = text !== '' && !text.startsWith('{')
  const answer = act(state, `${request.method} ${path}`, isForm ? readForm(text) : readJson(text))
  if (isForm && answer.status === 200) {
    response.writeHead(303, { location: '/' }).end()
    return
  }
  answerJson(response, answer.status, answer.body)
}

function act(state: FakeState, what: string, sent: unknown): { status: number; body: unknown } {
  try {
    switch (what) {
      case 'POST /__fake/scenario': {
        const { scenario, latitude, longitude } = scenarioSchema.parse(sent)
        const isPlace = latitude !== undefined && longitude !== undefined
        state.setScenario(scenario, isPlace ? { latitude, longitude } : undefined)
        return { status: 200, body: { scenario: state.scenario, places: state.places } }
      }
      case 'POST /__fake/fault':
        state.setFault(faultSchema.parse(sent))
        return { status: 200, body: { fault: state.fault } }
      case 'DELETE /__fake/fault':
        state.fault = null
        return { status: 200, body: { fault: null } }
      case 'POST /__fake/clock':
        state.setClock(clockSchema.parse(sent).now)
        return { status: 200, body: { now: state.now().toISOString() } }
      case 'GET /__fake/requests':
        return { status: 200, body: { requests: state.requests } }
      case 'DELETE /__fake/requests':
        state.requests = []
        return { status: 200, body: { requests: [] } }
      default:
        return { status: 404, body: { error: `${what} is not known here` } }
    }
  } catch (error) {
    if (!(error instanceof z.ZodError)) throw error
    return { status: 400, body: { error: z.prettifyError(error) } }
  }
}

/** Fields left empty are fields not given. */
function readForm(text: string): unknown {
  return Object.fromEntries([...new URLSearchParams(text)].filter(([, value]) => value !== ''))
}

function readJson(text: string): unknown {
  try {
    return JSON.parse(text)
  } catch {
    return null
  }
}
