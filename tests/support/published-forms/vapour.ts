// Published forms of vapour over ice and water that the model does not use, kept to be held beside it.
import { inRange } from '@/lib/physics/check'

/** Sublimation pressure of ice, IAPWS R14-08. [Pa] T in K, 50 to 273.16. */
export function iapwsSublimationPa(kelvin: number): number {
  const theta = kelvin / 273.16
  const sum = -21.2144006 * theta ** 0.00333333333 + 27.3203819 * theta ** 1.20666667 - 6.1059813 * theta ** 1.70333333
  return 611.657 * Math.exp(sum / theta)
}

/** Saturation pressure of water, IAPWS-95 auxiliary equation (Wagner & Pruss 2002). [Pa] T in K. */
export function iapwsSaturationPa(kelvin: number): number {
  const tau = 1 - kelvin / 647.096
  const sum =
    -7.85951783 * tau +
    1.84408259 * tau ** 1.5 -
    11.7866497 * tau ** 3 +
    22.6807411 * tau ** 3.5 -
    15.9618719 * tau ** 4 +
    1.80122502 * tau ** 7.5
  return 22.064e6 * Math.exp((647.096 / kelvin) * sum)
}

/**
 * Frost point (over ice) from vapour pressure.
 *
 * @param vapourPressureHpa Vapour pressure. [hPa], above 0 to 6.112
 * @returns Frost point. [°C]
 * @throws RangeError outside the range: above 6.112 hPa there is no frost point.
 *
 * Source: inversion of the WMO-No. 8 Magnus form over ice.
 */
export function frostPointC(vapourPressureHpa: number): number {
  inRange('vapourPressureHpa [hPa]', vapourPressureHpa, 1e-6, 6.112)
  const logRatio = Math.log(vapourPressureHpa / 6.112)
  return (272.62 * logRatio) / (22.46 - logRatio)
}
