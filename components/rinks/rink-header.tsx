// The line on top of every page of a rink: its name, what the page is about, and how many people share it.
export function RinkHeader({ name, about, people }: { name: string; about: string; people?: number }) {
  return (
    <header className="flex items-baseline gap-3 border-b border-rule pt-4 pb-5">
      <p className="flex flex-wrap items-baseline gap-x-3">
        <span className="font-semibold">{name}</span>
        <span className="text-note text-graphite">{about}</span>
      </p>
      {people !== undefined && people > 1 ? (
        <p className="ml-auto shrink-0 text-note text-graphite">{people} people</p>
      ) : null}
    </header>
  )
}
