// For headlines: a figure and its unit, and a time of day, stay on one line.
const UNITS = 'am|pm|h|min|L|m³|mm|cm|m|in|ft|gal|kg|lb|%|°C|°F|km/h|m/s|mph|US gal'

const AFTER_FIGURE = new RegExp(`(\\d) (?=(?:${UNITS})(?![a-z]))`, 'g')

export function unbroken(text: string): string {
  return text.replace(AFTER_FIGURE, '$1\u00a0')
}
