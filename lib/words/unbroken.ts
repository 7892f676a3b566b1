// For headlines: a figure and its unit, and a time of day, stay on one line.
export function unbroken(text: string): string {
  return text.replace(/(\d) (am|pm|h|min|L|cm|mm|gal|ft|%)(?![a-z])/g, '$1\u00a0$2')
}
