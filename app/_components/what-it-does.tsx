// What a keeper gets, in three lines.
const PARTS = [
  {
    name: 'Before the season',
    text: 'Sums for floor, water, hose hours, boards and liner; then the days on which to fill, and when the ice will carry.',
  },
  {
    name: 'Night after night',
    text: 'Good hours, passes that are set before snow, sun or skaters reach them, and how many forecast runs agree.',
  },
  {
    name: 'In time',
    text: 'One message in the afternoon, another only when the night changes, none through a thaw. Crew and skaters see the same page.',
  },
]

export function WhatItDoes() {
  return (
    <dl className="mt-8 grid gap-x-14 gap-y-4 border-t border-rule pt-4 lg:grid-cols-3">
      {PARTS.map(({ name, text }) => (
        <div key={name}>
          <dt className="font-medium">{name}</dt>
          <dd className="text-note text-graphite">{text}</dd>
        </div>
      ))}
    </dl>
  )
}
