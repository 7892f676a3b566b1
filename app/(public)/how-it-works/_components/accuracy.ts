// How well the model and the advice do, as printed by `npm run validate` and `npm run bench:advice` on the day below.

export const MEASURED_ON = '2026-12-01'

export interface ModelFigure {
  against: string
  /** Mean error and root mean square error, or what else was measured. */
  figure: string
}

export const MODEL_FIGURES: ModelFigure[] = [
  { against: 'Drilled ice of a lake in Finland, 13 intervals under measured weather', figure: '+0.09 cm; 1.95 cm' },
  { against: 'Those of them with 3 cm of snow or less', figure: '−0.22 cm; 1.78 cm' },
  { against: 'The same lake through the season of 2015, run in one go', figure: '+0.31 cm; 0.74 cm' },
  { against: 'Three more lakes from daily means, 3 cm of snow or less', figure: '+0.30 cm; 3.68 cm' },
  { against: 'How strongly a clear sky shines, beside other published forms', figure: 'within 0.03' },
  { against: 'Heat to the air and by evaporation over a wet sheet, beside FLake', figure: 'each within 15 %' },
  {
    against: 'Time for a flood to set, beside a column cut into slices of 1 mm',
    figure: 'off by 0.8 % (median), 3.6 % (19 of 20)',
  },
]

export interface AdviceFigure {
  who: string
  /** Share of the nights with a good hour that were used. [%] */
  usedPercent: number
  /** Share of floods that were spoiled. [%] */
  spoiledPercent: number
}

export const ADVICE_FIGURES: AdviceFigure[] = [
  { who: 'Nightsheet, if forecasts were perfect', usedPercent: 95.9, spoiledPercent: 0 },
  { who: 'Nightsheet, forecast read anew each hour', usedPercent: 89, spoiledPercent: 3.7 },
  { who: 'Nightsheet, told once in the afternoon', usedPercent: 85.9, spoiledPercent: 4.8 },
  { who: 'Flood at −2 °C or colder', usedPercent: 74, spoiledPercent: 9 },
  { who: 'Flood at −4 °C or colder', usedPercent: 61.8, spoiledPercent: 5 },
  { who: 'Flood at −5 °C or colder', usedPercent: 55.3, spoiledPercent: 2.9 },
  { who: 'Flood at −7 °C or colder', usedPercent: 43.9, spoiledPercent: 1.8 },
]
