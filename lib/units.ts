// The only place where units are converted. Inside everything is SI and °C; these are for what people read.

export const celsiusToFahrenheit = (temperatureC: number) => temperatureC * 1.8 + 32
export const fahrenheitToCelsius = (temperatureF: number) => (temperatureF - 32) / 1.8

/** International inch, 25.4 mm by definition. */
export const mmToInches = (mm: number) => mm / 25.4
export const inchesToMm = (inches: number) => inches * 25.4
export const metresToFeet = (metres: number) => metres / 0.3048
export const feetToMetres = (feet: number) => feet * 0.3048

/** US gallon, 3.785411784 L by definition; Canadian keepers who think in gallons mostly mean this one too. */
export const litresToGallons = (litres: number) => litres / 3.785411784
export const gallonsToLitres = (gallons: number) => gallons * 3.785411784

/** International mile, 1609.344 m by definition. */
export const mpsToMph = (mps: number) => (mps * 3600) / 1609.344
export const mpsToKmh = (mps: number) => mps * 3.6
