// Paragraphs that begin with their name, a hairline under each; numbered where the order matters.
export interface NamedLine {
  name: string
  text: string
}

export function NamedLines({ title, lines, isOrdered }: { title: string; lines: NamedLine[]; isOrdered?: boolean }) {
  const List = isOrdered ? 'ol' : 'ul'
  return (
    <section className="mb-8 max-w-line">
      <h2 className="mb-2 font-semibold">{title}</h2>
      <List className={`border-t border-rule ${isOrdered ? 'list-inside list-decimal' : 'list-none'} p-0`}>
        {lines.map(({ name, text }) => (
          <li key={name} className="border-b border-rule py-2.5">
            <b className="font-medium">{name}</b> {text}
          </li>
        ))}
      </List>
    </section>
  )
}
