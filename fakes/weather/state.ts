// What the fake has been told, and what it has been asked.
import type { Fault } from './faults'
import { DEFAULT_SCENARIO, type ScenarioName } from './scenarios'

/** A scenario set for a place covers the yards around it. */
const NEAR_DEG = 0.05
const KEPT_REQUESTS = 500

export interface LoggedRequest {
  at: string
  path: string
  query: string
  userAgent: string
  /** Whether a key came along; never the key. */
  withKey: boolean
  /** Calls it counts for against the service's quota. */
  weight: number
  fault: string | null
  status: number | null
}

export class FakeState {
  scenario: ScenarioName = DEFAULT_SCENARIO
  places: { latitude: number; longitude: number; scenario: ScenarioName }[] = []
  fault: Fault | null = null
  requests: LoggedRequest[] = []
  private frozenNow: Date | null = null

  now(): Date {
    return this.frozenNow ?? new Date()
  }

  setClock(now: Date | null): void {
    this.frozenNow = now
  }

  /** For every place, or near one. */
  setScenario(scenario: ScenarioName, place?: { latitude: number; longitude: number }): void {
    if (!place) {
      this.scenario = scenario
      this.places = []
      return
    }
    this.places = this.places.filter((other) => !isNear(other, place))
    this.places.push({ ...place, scenario })
  }

  setFault(fault: Fault): void {
    this.fault = fault.kind === 'none' ? null : fault
  }

  scenarioAt(latitude: number, longitude: number): ScenarioName {
    return this.places.find((place) => isNear(place, { latitude, longitude }))?.scenario ?? this.scenario
  }

  /** The fault for this request, if any; uses up one of its times. */
  takeFault(): Fault | null {
    const fault = this.fault
    if (fault?.times !== undefined) this.fault = fault.times > 1 ? { ...fault, times: fault.times - 1 } : null
    return fault
  }

  log(request: LoggedRequest): void {
    this.requests.push(request)
    if (this.requests.length > KEPT_REQUESTS) this.requests.shift()
  }
}

function isNear(a: { latitude: number; longitude: number }, b: { latitude: number; longitude: number }): boolean {
  return Math.abs(a.latitude - b.latitude) <= NEAR_DEG && Math.abs(a.longitude - b.longitude) <= NEAR_DEG
}
