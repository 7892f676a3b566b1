// The page of the fake: which weather it tells, and who asked for it.
import { escapeHtml as escape, page, table } from '../page'
import { FAULT_KINDS } from './faults'
import { SCENARIOS } from './scenarios'
import type { FakeState } from './state'

export function writePage(state: FakeState): string {
  const body = `<h1>Pretended weather service</h1>
<p>It answers <code>/v1/forecast</code> and <code>/v1/ensemble</code> with weather made up for tonight. Its clock says ${escape(state.now().toUTCString())}.</p>
<h2>Weather everywhere</h2>
${table(
  ['Weather', 'What comes', ''],
  Object.entries(SCENARIOS).map(([name, scenario]) => scenarioRow(name, scenario, name === state.scenario)),
)}
<h2>Weather near a place</h2>
${writePlaces(state)}
<form method="post" action="/__fake/scenario"><select name="scenario" aria-label="Weather">${options(Object.keys(SCENARIOS))}</select>
<label>latitude <input name="latitude" size="7" required></label> <label>longitude <input name="longitude" size="7" required></label> <button>Set</button></form>
<h2>Faults</h2>
<div>${state.fault ? `Answers <b>${escape(state.fault.kind)}</b>${state.fault.times ? `, ${state.fault.times} more times` : ' until cleared'}. <form method="post" action="/__fake/fault"><button name="kind" value="none">Clear</button></form>` : 'None: every request is answered well.'}</div>
<form method="post" action="/__fake/fault"><select name="kind" aria-label="Fault">${options(FAULT_KINDS)}</select>
<label>times <input name="times" size="4" inputmode="numeric"></label> <button>Set</button></form>
<h2>Requests</h2>
${writeRequests(state)}`
  return page('Pretended weather service', body)
}

function scenarioRow(name: string, scenario: { title: string; tells: string }, isCurrent: boolean): string[] {
  const action = isCurrent
    ? '<b>told now</b>'
    : `<form method="post" action="/__fake/scenario"><button name="scenario" value="${escape(name)}" aria-label="Tell ${escape(scenario.title)}">Tell this</button></form>`
  return [escape(scenario.title), escape(scenario.tells), action]
}

function writePlaces(state: FakeState): string {
  if (state.places.length === 0) return '<p>The same everywhere.</p>'
  const items = state.places.map(
    (p) => `<li>${p.latitude}, ${p.longitude}: ${escape(SCENARIOS[p.scenario].title)}</li>`,
  )
  return `<ul>${items.join('')}</ul>`
}

function writeRequests(state: FakeState): string {
  if (state.requests.length === 0) return '<p>None yet.</p>'
  const weight = state.requests.reduce((sum, request) => sum + request.weight, 0)
  const rows = state.requests
    .slice(-30)
    .reverse()
    .map((r) => [
      r.at.slice(11, 19),
      `${r.status ?? 'no answer'}${r.fault ? ` (${escape(r.fault)})` : ''}`,
      r.weight.toFixed(1),
      escape(`${r.path}?${r.query}`).replace(/(&amp;|,)/g, '$1<wbr>'),
    ])
  return `<p>${state.requests.length} kept, weighing ${weight.toFixed(1)} calls; the latest first.</p>
${table(['UTC', 'Answer', 'Weight', 'Asked'], rows)}`
}

function options(names: readonly string[]): string {
  return names.map((name) => `<option>${escape(name)}</option>`).join('')
}
