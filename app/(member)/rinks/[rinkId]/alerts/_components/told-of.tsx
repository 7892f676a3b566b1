// What one is told of in each phase of the season, the rink's own marked.
import type { Phase } from '@/lib/advice/types'

const ROWS: { phases: Phase[]; name: string; toldOf: string }[] = [
  {
    phases: ['waiting'],
    name: 'Waiting for the fill',
    toldOf: 'A day to fill, up to five days ahead, once. Again when it moves to another day or falls away.',
  },
  {
    phases: ['filling'],
    name: 'Filling',
    toldOf: 'A look at hose and liner every two hours, for those who look after the fill.',
  },
  { phases: ['freezing'], name: 'Freezing', toldOf: 'A good night to flood, once the ice bears a flood.' },
  {
    phases: ['skating'],
    name: 'Skating',
    toldOf:
      'A good night to flood, once. Again when its hours change or it is called off. A thaw, once, within a day of it.',
  },
  { phases: ['thaw'], name: 'Thaw', toldOf: 'Nothing, until a night is good to flood again.' },
  { phases: ['planning', 'closed'], name: 'Before and after the season', toldOf: 'Nothing.' },
]

export function ToldOf({ phase }: { phase: Phase }) {
  return (
    <dl>
      {ROWS.map(({ phases, name, toldOf }) => (
        <div key={name} className="border-b border-rule py-2 first:pt-0">
          <dt className="font-medium">
            {name}
            {phases.includes(phase) ? <span className="text-note text-graphite"> now</span> : null}
          </dt>
          <dd className="text-graphite">{toldOf}</dd>
        </div>
      ))}
    </dl>
  )
}
