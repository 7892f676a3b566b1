// The drawn cut: scales, water and boards where the sums have them, and its words.
import { renderToStaticMarkup } from 'react-dom/server'
import { expect, test } from 'vitest'
import { CrossSection } from '@/components/charts/cross-section'
import { layOutCut, NARROW, WIDE } from '@/components/charts/cross-section-layout'
import { buildSums } from '@/lib/advice/build-sums'

// 0 and 20 cm below the string over 10 m, 5 cm of water at the high end: 25 cm at the low one, boards 30 cm there.
const sums = buildSums({
  lengthM: 10,
  widthM: 4,
  floor: { cornersM: [0, 0, 0.2, 0.2] },
  leastDepthM: 0.05,
  flow: { lPerMin: 25 },
  seasonYear: 2026,
})

test.each([WIDE, NARROW])('heights on a drawing %o are to one scale', (size) => {
  const cut = layOutCut(sums, size)
  const pxPerM = (cut.lowFootY - cut.boardTopY) / 0.3
  expect(cut.highFootY - cut.boardTopY).toBeCloseTo(0.1 * pxPerM, 0)
  expect(cut.levelY - cut.boardTopY).toBeCloseTo(0.05 * pxPerM, 0)
  expect(cut.exaggeration).toBeCloseTo(pxPerM / ((cut.right - cut.left) / (sums.section.at(-1)?.alongM ?? 1)), 0)
  expect(cut.lowFootY).toBeLessThan(size.height - size.bottom)
})

test('the drawing says in words what it shows, and carries no style attribute', () => {
  const labels = { description: 'A cut', waterLine: 'water line', high: 'high', low: 'low', push: 'push', fall: 'fall' }
  const markup = renderToStaticMarkup(<CrossSection sums={sums} labels={labels} />)
  expect(markup.match(/role="img" aria-label="A cut"/g)).toHaveLength(2)
  expect(markup).not.toContain('style=')
})
