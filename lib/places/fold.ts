// Makes names comparable: lower case, no accents, one space between words.

/** Letters that Unicode does not split into a base letter and an accent. */
const WHOLE_LETTERS: Record<string, string> = {
  ø: 'o',
  ł: 'l',
  đ: 'd',
  ð: 'd',
  þ: 'th',
  ß: 'ss',
  æ: 'ae',
  œ: 'oe',
  ı: 'i',
}

/** Most names need no work; the gazetteer folds 135,000 of them at once. */
const PLAIN = /^[a-z]+( [a-z]+)*$/

export function foldName(name: string): string {
  const lower = name.toLowerCase()
  if (PLAIN.test(lower)) return lower
  return lower
    .normalize('NFD')
    .replace(/[øłđðþßæœı]/g, (letter) => WHOLE_LETTERS[letter] ?? letter)
    .replace(/[\u0300-\u036f'’]/g, '')
    .replace(/[^\p{L}\p{N}]+/gu, ' ')
    .trim()
}
