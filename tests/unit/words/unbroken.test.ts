// Figures keep their units beside them.
import { expect, test } from 'vitest'
import { unbroken } from '@/lib/words/unbroken'

test.each([
  ['4.1 cm of ice on 8.3 cm of water.', '4.1\u00a0cm of ice on 8.3\u00a0cm of water.'],
  ['Flood between 11 pm and 1:30 am.', 'Flood between 11\u00a0pm and 1:30\u00a0am.'],
  ['3.3 in, and 17.6 m³ in 8 h 20 min', '3.3\u00a0in, and 17.6\u00a0m³ in 8\u00a0h 20\u00a0min'],
  ['41 floods, 9 months, 3 inches', '41 floods, 9 months, 3 inches'],
])('%s', (text, expected) => {
  expect(unbroken(text)).toBe(expected)
})
