// Horizontal bars of water: what fills a shape that means filling, whatever the colours show.

/** Stands in an svg's defs; shapes fill with `url(#id)`. */
export function BarredPattern({ id }: { id: string }) {
  return (
    <pattern id={id} width={4} height={4} patternUnits="userSpaceOnUse">
      <rect width={4} height={1.8} className="fill-hose" />
    </pattern>
  )
}
