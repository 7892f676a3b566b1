// Every limit the advice rests on, in one place: its value, and the rule of thumb behind it or "ours".
// Rule ids are those of our collection of published rules of thumb; the name after the id is the original source.

/** A one-sided desirability after Derringer & Suich (J. Quality Technology 12, 1980): 1 at `one`, 0 at `zero`, straight between. */
export interface Ramp {
  one: number
  zero: number
}

export const VERDICT = {
  /** Scores of this much or more are good hours. Ours: a layer that takes the whole evening and just makes it has about this. */
  goodScore: 35,
}

/** When a flood must be set. */
export const NEEDED = {
  /** 7 am by the rink's clock. Rules J04: Mankato Free Press, and J09: New Ulm Journal (night shifts end at 6 am); the hour more is ours. */
  readyByMinuteOfDay: 7 * 60,
  /** A flood started later than this before 7 am is for the next day. Ours. [min] */
  leastMinutesAhead: 180,
}

export const FLOOD = {
  /**
   * Time to set, as exp(-(minutes - quick) / fade). Rules E01: Brampton rink diary (10-30 min for light coats) and
   * E05: Lynwood Village (3 h for two); the fade is ours. [min]
   */
  set: { quickMinutes: 30, fadeMinutes: 300 },
  /** Longer than this is no flood. Rule E04: AQLM and Ville de Montréal (a deep flood freezes through within 24 h). [min] */
  longestSetMinutes: 24 * 60,
  /** Minutes between set and needed. Ours. */
  slackMinutes: { one: 120, zero: 0 } satisfies Ramp,
  /** Wet surface at 0 °C. 2.5 mm/h sets the common 3 mm coat (rule D03: Truro News) in little over an hour; ours. [mm/h] */
  freezeRateMmPerH: { one: 2.5, zero: 0 } satisfies Ramp,
  /** Above this a thin coat freezes in an evening, whatever the thermometer says. Ours. [mm/h] */
  freezesWellMmPerH: 0.4,
  /** Less than this is slow for a night that the thermometer calls cold enough: a clear one at -5 °C brings about twice that. Ours. [mm/h] */
  slowForColdMmPerH: 1,
  /** Rain or snow from pour to set. Rule I05: Les Versants (no watering in snowfall, however light); a tenth is a trace. [mm] */
  precipitationMm: 0.1,
  /** It must stay dry this share of the set time longer, for what the model may be off. Ours. */
  setMargin: 0.2,
  /** What a trace within that limit costs. Ours. */
  traceFactor: 0.7,
  /** No published wind speed. Rules K02: Canton Patch (heavy wind roughens), K03: Town of Sunapee (a breeze helps); figures ours. [m/s] */
  windAtRinkMps: { one: 5, zero: 12 } satisfies Ramp,
  /** Gusts at rink height. Ours, as above. [m/s] */
  gustAtRinkMps: { one: 10, zero: 20 } satisfies Ramp,
  /**
   * Warm side. Written rules say -4 °C (rules C01: Appleton Parks, C02: Naperville Park District), and 0 °C
   * (C06: College Park). The heat balance decides in their stead; this only marks down what a small forecast error would spoil. Ours. [°C]
   */
  airTooWarmC: { one: -2, zero: 4 } satisfies Ramp,
  /** The thermometer rule that keepers know, for the sentence that says where we differ. Rule C01: Appleton Parks. [°C] */
  thermometerRuleC: -4,
  /**
   * Cold side, the layer: cracks, shell ice, no bond. Rules C22: Naperville Park District (finish coats below -15 °C), C25: Lake Summerside,
   * C27: Southwest Journal, C26: Rosemont (-28 °C, failed). [°C]
   */
  airTooColdC: { one: -15, zero: -28 } satisfies Ramp,
  /** Water still on the sheet. Rules D01 and D12: Naperville Park District, D08: Town of Sunapee (frozen before the next). [mm] */
  wetMm: { one: 0.1, zero: 1 } satisfies Ramp,
  /**
   * Snow to clear first. Rules I06: Chappelle Gardens (never on snow), I01: City of Ottawa (10 cm is a day's job, less
   * is cleared within 12 h). [cm]
   */
  snowToClearCm: { one: 0.3, zero: 10 } satisfies Ramp,
  /** Floating ice that carries a person with a hose. Rule G01: Marsh Canada (2 in); the lower end is ours. [mm] */
  bearsMm: { one: 50, zero: 30 } satisfies Ramp,
  /** With no water under it the floor carries the person; less than this is no sheet. Ours. [mm] */
  leastIceMm: 0.5,
  /** So much of a fill may have gone by wind and sun, or in rounding a hole, before water is thought to be under a sheet. Ours. [mm] */
  lostOfFillMm: 10,
  /** Exponents of the geometric mean. Ours: the set time says most. */
  weights: { set: 4, slack: 2, rate: 2, dry: 2, wind: 1, gust: 1, air: 1, lastLayer: 1, snow: 1, bears: 1 },
}

/** What came of a flood, once somebody looked. */
export const FOUND = {
  /** Nobody stands by with a watch: this much after what was said still counts as kept. Ours. [min] */
  graceMinutes: 15,
}

/** A sheet as people tell of it. */
export const REPORTED = {
  /** Nobody measures it, and a sheet forgets it within a day: a little below freezing. Ours. [°C] */
  iceTemperatureC: -2,
}

/** Limits of the person and the hose; they cap the score, they are never averaged with the ice. */
export const PERSON = {
  /** A hose in a flood. Rules C20: Appleton Parks (0 °F), C23: Copperfield Mahogany (below -20 °C hoses freeze). 0.4 at -20. [°C] */
  floodHoseC: { one: -17, zero: -22 } satisfies Ramp,
  /** Bare skin. Rules Q01 to Q03: Environment Canada bands: from -28 frostbite in 30 min, from -48 stop. 0.4 at -40. [°C wind chill] */
  windChillC: { one: -28, zero: -48 } satisfies Ramp,
  /** A cold hose that runs for hours. Common practice: comfortable near 0, frozen at -4 to -5. 0.4 near -4. [°C] */
  fillHoseC: { one: -2, zero: -5 } satisfies Ramp,
  /** Hands in water for hours. Ours, well short of Q01: Environment Canada. [°C wind chill] */
  fillWindChillC: { one: -10, zero: -25 } satisfies Ramp,
}

export const FILL = {
  /** Gusts on an open liner. Rule K01: Ozaukee Press (nearly windless, or it flies like a sail); figures ours. [m/s at the rink] */
  linerGustMps: { one: 5, zero: 10 } satisfies Ramp,
  /** Ice grown in the days after the fill. Rule A26: Wiscasset Newspaper (two ice-making days); A02: City of Burlington asks for five nights. [mm] */
  iceAfterMm: { one: 50, zero: 10 } satisfies Ramp,
  /** Over how long, and the least that must be forecast to tell. Ours. [h] */
  coldLookAheadHours: 72,
  /** A fill split over more than this is not one fill: what is in freezes to the floor between the sessions. Ours. [h] */
  longestHours: 72,
  leastLookAheadHours: 24,
  /** Fills done within so many hours are taken to freeze alike. Ours. [h] */
  lookEveryHours: 3,
  /** Snow before the skin bears it: it sinks in and turns to slush. Rules I05: Les Versants, I07: KSTP Saint Paul (light snow workable). [cm] */
  snowBeforeSkinCm: { one: 1, zero: 5 } satisfies Ramp,
  /** Air so warm that the water only warms. Ours. [°C] */
  airTooWarmC: { one: 3, zero: 10 } satisfies Ramp,
  /** Ice that holds up new snow. Ours. [mm] */
  skinMm: 10,
  /** Ice that carries skaters on land. Rules G02: Naperville Park District (4 in), G03: MétéoMédia. [mm] */
  carriesSkaterMm: 100,
  weights: { cold: 3, snow: 2, liner: 2, air: 1 },
}

/** Before a rink is built. */
export const BUILD = {
  /** High to low side. Rule M01: City of Burlington (10 to 12 in). [m] */
  mostFallM: 0.305,
  /** Board above the water: it takes the rise on freezing and a season's floods. Ours. [m] */
  freeboardM: 0.05,
  /** Nominal two-inch lumber, dressed: 1½ in. Softwood standard PS 20, from memory. [m] */
  boardThicknessM: 0.0381,
  /** Liner down the outside, to spare each side, and for folds. Up and over is common practice; figures ours. [m, m, share] */
  tuckM: 0.15,
  overlapM: 0.15,
  foldShare: 0.03,
  /** Liners are sold by the half metre. Ours. [m] */
  linerStepM: 0.5,
  /** Liners are ordered by the end of September; by late November stock is thin. Common practice, no source. */
  orderByMonthDay: '09-30',
}

/** While the hose runs. */
export const FILLING = {
  /** Somebody looks at hose and liner every couple of hours. Common practice, no source. [h] */
  checkEveryHours: 2,
  /** A running cold hose has frozen at -4 to -5. Common practice, no source. [°C] */
  hoseFreezesC: -4,
  /** How far a warning looks ahead. Ours. [h] */
  hoseAheadHours: 24,
  /** What a level read off a stick is good for, two readings together. Ours. [mm] */
  readingToleranceMm: 5,
  /** Two looks closer together than this tell of no rate: a slip of the stick would read as a burst. Ours. [h] */
  leastHoursBetweenReadings: 0.5,
  /** A hose gives this much less than the bucket said before the level tells of a leak. Ours. [share of the rise] */
  flowTolerance: 0.15,
  /** Evaporation allowed for: a latent loss of 60 W/m² over a day, typical of open water in light wind at -10 °C. Derived. [mm/day] */
  evaporationMmPerDay: 2,
  /** Readings further back say little of a leak now. Ours. [h] */
  leakLookBackHours: 24,
}

export const THAW = {
  /** At least a day. Ours, with rule H22: AQLM and Ville de Montréal (one or two warm days). [h] */
  leastHours: 24,
  /** Less than this is wear, not thaw. Ours. [mm] */
  leastLossMm: 1,
  /** Slower than this is evaporation, not melting. Ours. [mm/h] */
  losingMmPerH: 0.05,
}

export const AGREEMENT = {
  /**
   * Below this share of runs a window is no advice to go out. Ours, from `npm run bench:advice`, which also chooses it on
   * two winters and tries it on the third: told once at 15:30 it spoils under one flood in twenty.
   */
  least: 0.65,
  /** Perturbed runs where the provider has no members. Ours: twice as many say no more, and cost twice the time. */
  defaultRuns: 24,
}

export const PLAN = {
  /** Passes start on the quarter hour. Ours. */
  stepMinutes: 15,
  /** Scores are compared in steps of this size; within a step the earlier plan is preferred. Ours. */
  scoreStep: 10,
  /** What a trip costs, as a share of a layer: a pass must be worth more than this to be planned. Ours. */
  tripCostShare: 0.25,
}

export const SNOW_RULES = {
  /** Rule I08: AQLM and Ville de Montréal: near 0 °C, wet, then a sharp fall, with snow on the sheet: finish clearing or leave it even. */
  nearZeroC: -1,
  sharpFallC: -6,
  withinHours: 12,
  /** Rule I09: Van Koughnet: rain on a clear sheet before cold is a flood for nothing. Amount ours. [mm] */
  freeFloodMm: 0.5,
}

export const SNOW_ON_THIN_ICE = {
  /** Snow due within so long is worth a word, from so much on. Ours. [h, cm] */
  aheadHours: 24,
  leastCm: 1,
  /** New snow near -5 °C. Anderson 1976: 104 kg/m³; 10:1 in the NCDC table for 34-28 °F. [kg/m³] */
  newSnowKgM3: 100,
}

export const CAUTIONS = {
  /** From here the page says how cold it feels. Ours. [°C wind chill] */
  feelsColdC: -10,
  /** Rules Q01 to Q04: Environment Canada. Coldest band first. */
  frostbite: [
    { windChillC: -55, minutes: 2 },
    { windChillC: -48, minutes: 5 },
    { windChillC: -40, minutes: 10 },
    { windChillC: -28, minutes: 30 },
  ],
  /** A hose left full between passes. Rules N01: Portman Hockey, N02: Truro News (drain it); temperature from common practice. [°C] */
  hoseFreezesC: -4,
}
