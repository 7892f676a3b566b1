// Quantities and times in words, in both units and on both clocks.
import { describe, expect, test } from 'vitest'
import { IMPERIAL, METRIC } from '@/lib/units'
import type { WordOptions } from '@/lib/words/options'
import {
  areaText,
  durationText,
  flowText,
  iceText,
  layerText,
  numberText,
  rateText,
  signedTemperatureText,
  sizeText,
  snowText,
  temperatureText,
  waterText,
  windText,
} from '@/lib/words/quantities'
import { clockText, dayPartText, doneByText, nightText, spanText } from '@/lib/words/times'

const metric: WordOptions = { timeZone: 'America/Toronto', units: METRIC, clock: '12', locale: 'en' }
const imperial: WordOptions = { ...metric, units: IMPERIAL }
/** As many Canadians read them. */
const mixed: WordOptions = { ...metric, units: { temperature: 'C', ice: 'in', water: 'gal', size: 'ft', wind: 'm/s' } }
const clock24: WordOptions = { ...metric, clock: '24' }

describe('quantities', () => {
  // Conversions by hand: -10 °C = 14 °F; 3 mm = 0.118 in; 94 mm = 3.70 in; 3.4 cm = 1.34 in; 2 m/s = 7.2 km/h = 4.47 mph;
  // 300 L = 79.25 US gal; 25 L = 6.60 US gal; 12.192 m = 40 ft; 100 m² = 1076.4 ft²; 2.5 mm/h = 0.098 in/h.
  test.each([
    [temperatureText(-10, metric), '−10 °C'],
    [temperatureText(-10, imperial), '14 °F'],
    [temperatureText(-0.3, metric), '0 °C'],
    [signedTemperatureText(1, metric), '+1 °C'],
    [layerText(3, metric), '3 mm'],
    [layerText(2.4, metric), '2.4 mm'],
    [layerText(3, imperial), '0.12 in'],
    [iceText(94, metric), '9.4 cm'],
    [iceText(94, imperial), '3.7 in'],
    [snowText(3.4, metric), '3.4 cm'],
    [snowText(3.4, imperial), '1.3 in'],
    [windText(2, metric), '7 km/h'],
    [windText(2, imperial), '4 mph'],
    [waterText(300, metric), '300 L'],
    [waterText(300, imperial), '79 gal'],
    [temperatureText(-10, mixed), '−10 °C'],
    [iceText(94, mixed), '3.7 in'],
    [windText(2, mixed), '2 m/s'],
    [flowText(25, metric), '25 L/min'],
    [flowText(25, mixed), '6.6 gal/min'],
    [sizeText(12.192, metric), '12.2 m'],
    [sizeText(12.192, mixed), '40 ft'],
    [areaText(100, metric), '100 m²'],
    [areaText(100, mixed), '1076 ft²'],
    [rateText(2.49, metric), '2.5 mm an hour'],
    [rateText(2.5, imperial), '0.10 in an hour'],
    [durationText(110), '1 h 50 min'],
    [durationText(45), '45 min'],
    [durationText(180), '3 h'],
    [numberText(12_000, 0, metric), '12,000'],
  ])('%s reads %s', (written, expected) => {
    expect(written).toBe(expected)
  })
})

describe('times by the rink’s clock', () => {
  // Toronto is UTC-5 in January.
  test.each([
    ['2027-01-13T01:00:00Z', '8 pm', '20:00'],
    ['2027-01-13T06:50:00Z', '1:50 am', '01:50'],
    ['2027-01-13T05:00:00Z', 'midnight', '00:00'],
    ['2027-01-12T17:00:00Z', 'noon', '12:00'],
    ['2027-01-12T17:20:00Z', '12:20 pm', '12:20'],
  ])('%s is %s or %s', (at, twelve, twentyFour) => {
    expect(clockText(at, metric)).toBe(twelve)
    expect(clockText(at, clock24)).toBe(twentyFour)
  })

  test('a moment by which something is done is told to the next five minutes', () => {
    expect(doneByText('2027-01-13T06:46:10Z', metric)).toBe('1:50 am')
  })

  const now = new Date('2027-01-12T21:00:00Z') // Tuesday, 4 pm
  test.each([
    ['2027-01-12T23:30:00Z', 'this evening'],
    ['2027-01-13T04:00:00Z', 'tonight'],
    ['2027-01-13T13:00:00Z', 'tomorrow morning'],
    ['2027-01-14T00:00:00Z', 'tomorrow evening'],
    ['2027-01-14T04:00:00Z', 'tomorrow night'],
    ['2027-01-15T00:00:00Z', 'Thursday evening'],
    ['2027-01-15T06:00:00Z', 'Thursday night'],
  ])('%s is %s', (at, expected) => {
    expect(dayPartText(at, now, metric)).toBe(expected)
  })

  test('nights and spans', () => {
    expect(nightText('2027-01-12', now, metric)).toBe('tonight')
    expect(nightText('2027-01-14', now, metric)).toBe('Thursday night')
    const smallHours = new Date('2027-01-13T10:00:00Z') // Wednesday, 5 am: still the night of Tuesday
    expect(nightText('2027-01-12', smallHours, metric)).toBe('tonight')
    expect(nightText('2027-01-13', smallHours, metric)).toBe('the coming night')
    expect(nightText('2027-01-14', smallHours, metric)).toBe('tomorrow night')
    expect(spanText('2027-01-13T01:00:00Z', '2027-01-13T06:00:00Z', now, metric)).toBe('between 8 pm and 1 am')
    expect(spanText('2027-01-12T20:00:00Z', '2027-01-13T06:00:00Z', now, metric)).toBe('until 1 am')
  })
})
