// HTML for mail, written so that a value cannot become markup.

export class Markup {
  constructor(readonly html: string) {}
}

type Value = string | Markup | Markup[]

/** Every value put into the template is escaped, unless it is markup made by this same function. */
export function markup(literals: TemplateStringsArray, ...values: Value[]): Markup {
  const parts = literals.map((literal, index) => literal + write(values[index] ?? ''))
  return new Markup(parts.join(''))
}

function write(value: Value): string {
  if (value instanceof Markup) return value.html
  if (Array.isArray(value)) return value.map(write).join('')
  return value.replace(/[&<>"']/g, (character) => `&#${character.charCodeAt(0)};`)
}
