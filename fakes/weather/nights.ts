// A box of nights, noon to noon, from which the scenarios are put together. All invented.

/** [clock hour, value]: 12 is noon, 24 midnight, 35 eleven the next morning; straight lines between, also across nights. */
export type Points = [hour: number, value: number][]
export type Curve = number | Points

export interface NightSketch {
  temperatureC: Curve
  /** 0-1 */
  humidity: Curve
  /** 0-1 */
  cloud: Curve
  windMps: Curve
  windFromDeg: number
  /** Strongest gust of an hour over its wind. */
  gustFactor: number
  /** At sea level. */
  pressureHpa: Curve
  rainMmPerH?: Curve
  snowCmPerH?: Curve
  /** Hours, from and to, for which the service knows nothing. */
  unknown?: [from: number, to: number][]
}

export type CurveField = 'temperatureC' | 'humidity' | 'cloud' | 'windMps' | 'pressureHpa' | 'rainMmPerH' | 'snowCmPerH'

const high = { pressureHpa: 1031, windFromDeg: 310, gustFactor: 1.7 }
const low = { pressureHpa: 1004, windFromDeg: 130, gustFactor: 1.6 }

// A table, kept in rows.
// prettier-ignore
export const NIGHTS = {
  clearThenSnow: {
    ...high,
    temperatureC: [
      [12, -3.1], [14, -2.4], [15, -2.8], [16, -3.9], [17, -5.2], [18, -6.4], [20, -8.1], [22, -9.3], [24, -10],
      [25, -10.1], [26, -9.6], [27, -8.7], [28, -7.7], [29, -6.8], [31, -5.6], [33, -4.2], [35, -2.2],
    ],
    humidity: [[12, 0.72], [18, 0.74], [25, 0.8], [29, 0.9], [32, 0.93], [35, 0.86]],
    cloud: [[12, 0.5], [15, 0.3], [17, 0.08], [25, 0.05], [26, 0.35], [27, 0.8], [28, 0.97], [34, 0.95], [35, 0.9]],
    windMps: [[12, 4], [15, 3.4], [18, 2.3], [21, 1.8], [26, 1.9], [29, 2.8], [35, 3.6]],
    pressureHpa: [[12, 1027], [21, 1029], [35, 1018]],
    snowCmPerH: [[28, 0], [29, 0.6], [30, 1], [31, 1.2], [32, 0.9], [33, 0.5], [34, 0]],
  },
  cloudThenHeavySnow: {
    ...low,
    temperatureC: [[12, -4], [15, -3.2], [18, -5], [22, -6.8], [26, -7.2], [29, -5.6], [35, -3]],
    humidity: [[12, 0.76], [22, 0.8], [28, 0.9], [35, 0.95]],
    cloud: [[12, 0.3], [17, 0.25], [20, 0.45], [23, 0.8], [26, 1], [35, 1]],
    windMps: [[12, 2.6], [20, 2.2], [28, 3.4], [35, 5]],
    pressureHpa: [[12, 1020], [24, 1014], [35, 1003]],
    snowCmPerH: [[28, 0], [29, 1.4], [30, 2.4], [32, 2.8], [35, 1.6]],
  },
  clearCold: {
    ...high,
    temperatureC: [[13, -4.5], [15, -4.1], [18, -7.6], [22, -10.6], [27, -12.6], [31, -13.2], [33, -10], [35, -7]],
    humidity: [[13, 0.66], [22, 0.76], [31, 0.83], [35, 0.7]],
    cloud: [[12, 0.15], [20, 0.04], [31, 0.06], [35, 0.12]],
    windMps: [[13, 3.4], [18, 2], [24, 1.4], [31, 1.6], [35, 3]],
  },
  coldDry: {
    ...high,
    temperatureC: [[13, -3.6], [18, -6.2], [24, -8.2], [31, -9], [35, -4.4]],
    humidity: [[13, 0.68], [31, 0.8], [35, 0.72]],
    cloud: [[12, 0.4], [20, 0.3], [30, 0.35], [35, 0.45]],
    windMps: [[13, 3.8], [22, 2.4], [35, 3.6]],
    pressureHpa: 1026,
  },
  coldAndCloudy: {
    ...low,
    temperatureC: [[14, -3.2], [18, -4], [24, -5], [31, -5.4], [35, -4]],
    humidity: [[14, 0.82], [24, 0.88], [35, 0.86]],
    cloud: [[12, 0.97], [20, 1], [35, 0.98]],
    windMps: [[14, 2.6], [24, 2], [35, 2.4]],
    pressureHpa: 1013,
  },
  greyMild: {
    ...low,
    temperatureC: [[14, 0.4], [19, -0.6], [26, -1.4], [31, -1.6], [35, 0]],
    humidity: [[14, 0.86], [26, 0.93], [35, 0.9]],
    cloud: [[12, 0.9], [22, 1], [35, 0.95]],
    windMps: [[14, 3], [26, 2.2], [35, 3]],
  },
  snowyEvening: {
    ...low,
    temperatureC: [[14, -2.4], [18, -3], [24, -4.6], [31, -7.4], [35, -5]],
    humidity: [[14, 0.88], [22, 0.95], [31, 0.84]],
    cloud: [[12, 1], [25, 0.95], [28, 0.5], [31, 0.25], [35, 0.3]],
    windMps: [[14, 4], [22, 4.6], [31, 3]],
    snowCmPerH: [[14, 0], [15, 0.7], [19, 1.5], [23, 0.8], [25, 0]],
  },
  thaw: {
    ...low,
    temperatureC: [[12, 4], [14, 5.8], [18, 4], [24, 2.8], [30, 2.2], [35, 4]],
    humidity: [[14, 0.78], [24, 0.9], [35, 0.84]],
    cloud: [[12, 0.7], [18, 0.9], [26, 0.8], [35, 0.75]],
    windMps: [[14, 4.6], [24, 3.4], [35, 4.4]],
    windFromDeg: 200,
  },
  wetThaw: {
    ...low,
    temperatureC: [[12, 3.6], [14, 4.4], [20, 3.6], [28, 2.4], [35, 3.2]],
    humidity: [[14, 0.9], [22, 0.97], [35, 0.93]],
    cloud: 1,
    windMps: [[14, 5.4], [24, 4.6], [35, 4]],
    windFromDeg: 190,
    rainMmPerH: [[16, 0], [18, 0.8], [22, 1.9], [25, 0.6], [27, 0]],
  },
  rainIntoFreeze: {
    ...low,
    temperatureC: [[12, 2.6], [15, 2.2], [18, 1.3], [20, 0.6], [21, -0.3], [23, -3.4], [26, -7], [31, -10.4], [35, -8]],
    humidity: [[12, 0.95], [20, 0.98], [24, 0.82], [31, 0.74], [35, 0.68]],
    cloud: [[12, 1], [22, 0.95], [24, 0.4], [27, 0.1], [35, 0.15]],
    windMps: [[12, 3.6], [20, 4.4], [22, 6.6], [25, 4.6], [31, 2.6], [35, 3]],
    windFromDeg: 330,
    pressureHpa: [[12, 999], [20, 997], [28, 1014], [35, 1022]],
    rainMmPerH: [[12, 0.6], [16, 1.6], [20, 1], [22, 0.2], [23, 0]],
  },
  deepCold: {
    ...high,
    temperatureC: [[14, -19.5], [18, -23], [24, -27.4], [31, -30.6], [33, -28], [35, -23]],
    humidity: [[14, 0.62], [31, 0.7]],
    cloud: [[12, 0.05], [31, 0.02], [35, 0.05]],
    windMps: [[14, 2.4], [22, 1.3], [31, 1], [35, 2]],
    pressureHpa: 1042,
  },
  windy: {
    ...low,
    temperatureC: [[14, -4.8], [20, -6.6], [26, -8], [31, -8.6], [35, -6.4]],
    humidity: [[14, 0.6], [31, 0.68]],
    cloud: [[12, 0.45], [22, 0.3], [35, 0.4]],
    windMps: [[12, 8.5], [16, 10], [24, 10.8], [31, 9.4], [35, 8.6]],
    windFromDeg: 300,
    pressureHpa: [[12, 1002], [35, 1014]],
  },
  clearWithGaps: {
    ...high,
    temperatureC: [[13, -3.4], [18, -6.2], [24, -9.4], [31, -11], [35, -6]],
    humidity: [[13, 0.68], [31, 0.82]],
    cloud: [[12, 0.2], [20, 0.06], [31, 0.1], [35, 0.2]],
    windMps: [[13, 3], [20, 1.9], [31, 1.6], [35, 2.8]],
    unknown: [[20, 21], [23, 28]],
  },
} satisfies Record<string, NightSketch>

export type NightName = keyof typeof NIGHTS
