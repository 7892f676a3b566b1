// The formulas of the model as the help page shows them; the docstrings of lib/physics and lib/advice say the same.
import { AGREEMENT, VERDICT } from '@/lib/advice/thresholds'

export interface Formula {
  name: string
  formula: string
  text: string
  source: string
}

export const HEAT_FORMULAS: Formula[] = [
  {
    name: 'The whole balance',
    formula: 'Q = longwave + sensible + latent − sun + precipitation',
    text: 'Positive when heat leaves. Water at 0 °C freezes at 3600 Q / L millimetres an hour; 92.7 W/m² make one millimetre.',
    source: 'Heat of fusion L = 333.6 kJ/kg (CRC Handbook).',
  },
  {
    name: 'Heat to the sky',
    formula: 'ε₀ = 1 − (1 + w) exp(−√(1.2 + 3w)),  w = 46.5 e/T',
    text: 'How strongly a clear sky shines back, from vapour pressure e in hPa and air temperature T in kelvin. The share of sky your yard sees counts; the rest shines at air temperature.',
    source: 'Prata 1996, Q. J. R. Meteorol. Soc. 122, 1127.',
  },
  {
    name: 'Cloud',
    formula: 'ε = (1 − 0.84c) ε₀ + 0.84c',
    text: 'Cloud cover c from 0 to 1. An overcast sky gives back nearly all that a sheet sends up.',
    source: 'Unsworth & Monteith 1975.',
  },
  {
    name: 'Heat to the air',
    formula: 'H = h (Tₛ − Tₐ),  h = ρ cₚ (0.0016 √(U² + w²) + 0.0008 m/s),  w = 0.5 ΔT^⅓ m/s',
    text: 'U is the wind at your rink, taken back to 10 m over open ground. In still air warm air rising keeps some exchange going; mild air over cold ice lies stable and damps it.',
    source:
      'Bulk aerodynamic form, its constants fitted by us to the fluxes of FLake over a wet surface at 0 °C; free convection after McAdams 1954.',
  },
  {
    name: 'Heat by evaporation',
    formula: 'E = (h/γ) (eₛ − e)',
    text: 'eₛ is the vapour pressure at the surface. Dry air takes heat, damp air gives some back as dew or frost.',
    source: 'Lewis relation; γ as FAO-56 eq. 8; eₛ over ice by WMO-No. 8, Annex 4.B, over water by Sonntag 1990.',
  },
  {
    name: 'Sun',
    formula: 'S = (1 − albedo) × sunshine;  without a forecast of it 1098 sin a · exp(−0.059/sin a) · (1 − 0.75 c³·⁴)',
    text: 'a is the height of the sun, and what stands round the yard hides it when it is low.',
    source: 'Haurwitz 1945; Kasten & Czeplak 1980; sun position by suncalc.',
  },
  {
    name: 'Wind at the rink',
    formula: 'u = u₁₀ · ln(2/0.03) / ln(10/0.03) · shelter',
    text: 'From 10 m down to head height over open ground, times 1, 0.6 or 0.3 for an open, suburban or tight yard.',
    source:
      'Log law, roughness by WMO-No. 8; the shelter factors are ours, beside a windbreak table of Brandle & Finch.',
  },
]

export const ICE_FORMULAS: Formula[] = [
  {
    name: 'A flood that sets',
    formula: '∫ Q dt + cold of the sheet = m (L + c T)',
    text: 'A layer of mass m poured at T is set once its heat has left upward and into the sheet below, through the skin that forms on it.',
    source: 'Conservation of energy; the skin after Ashton 1989.',
  },
  {
    name: 'Ice that grows',
    formula: 'dh/dt = (0 − Tₐ) / (ρ L (1/H + h/k + hₛ/kₛ))',
    text: 'The thicker the ice and the snow on it, the slower. Without the air term this is the older law h = √(2kΔT t / ρL), which makes thin ice far too fast.',
    source: 'Ashton 1989; Stefan 1891; snow conductivity Sturm et al. 1997.',
  },
  {
    name: 'Ground',
    formula: 'G = 5 W/m², on packed snow 2 W/m²',
    text: 'What seeps up from below once frost has gone in.',
    source: 'Ours, from 1.5 W/mK and 2 K over 0.3 m.',
  },
]

export const ADVICE_FORMULAS: Formula[] = [
  {
    name: 'The score of an hour',
    formula: 'D = (d₁^w₁ · d₂^w₂ · …)^(1/Σw)',
    text: `Each point (sets soon, dry until set, in time, wind, cold, snow to clear) counts from 0 to 1. One that is fatal is fatal. ${VERDICT.goodScore} of 100 is a good hour; what the person and the hose bear is a lid on top, never an average.`,
    source:
      'Derringer & Suich 1980; the points and weights are ours, each beside a written rule of towns and rink keepers.',
  },
  {
    name: 'How sure',
    formula: 'share of forecast runs in which the hour is good',
    text: `Runs of the weather service where there are some, else ${AGREEMENT.defaultRuns} runs disturbed as forecasts of that age are known to err. Below ${Math.round(AGREEMENT.least * 100)} of 100 we say hold off.`,
    source: 'Temperature errors by lead time from a published verification; the other sizes are ours.',
  },
  {
    name: 'The plan',
    formula: 'most ice for the fewest trips, no pass before the last is set',
    text: 'Every quarter hour in which you can go out is weighed against every other, exactly and not by the first good one.',
    source: 'Dynamic programming.',
  },
  {
    name: 'Wind chill',
    formula: '13.12 + 0.6215 T − 11.37 V^0.16 + 0.3965 T V^0.16',
    text: 'T in °C, V in km/h; it is about bare skin, ice never gets colder than the air and the sky make it.',
    source: 'Environment Canada 2001, with its frostbite bands.',
  },
]
