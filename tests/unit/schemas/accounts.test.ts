// What may be typed about oneself, and what is said otherwise.
import { expect, test } from 'vitest'
import { accountSchema, passwordSignInSchema, signUpSchema } from '@/lib/schemas/accounts'
import { faultsByField } from '@/lib/http/errors-by-field'

const GOOD = { name: ' Anna ', email: ' Anna@Example.org ', password: '0123456789' }

test('addresses are one, however they are typed', () => {
  expect(signUpSchema.parse(GOOD)).toEqual({ name: 'Anna', email: 'anna@example.org', password: '0123456789' })
})

test.each([
  ['name', '', 'Type your name.'],
  ['name', '   ', 'Type your name.'],
  ['name', 'x'.repeat(81), 'At most 80 characters.'],
  ['name', 'An\u0000na', 'Letters, figures and spaces only.'],
  ['name', 'Anna\r\nBcc: all', 'Letters, figures and spaces only.'],
  ['email', '', 'Type your e-mail address.'],
  ['email', 'anna', 'That does not look like an e-mail address: name@example.org'],
  ['email', 'anna@example.org\nBcc: x@y.z', 'That does not look like an e-mail address: name@example.org'],
  ['email', `${'x'.repeat(250)}@example.org`, 'That address is too long.'],
  ['password', '012345678', 'At least 10 characters.'],
  ['password', 'x'.repeat(201), 'At most 200 characters.'],
])('%s %o is refused with one sentence', (field, value, message) => {
  const result = signUpSchema.safeParse({ ...GOOD, [field]: value })
  expect(faultsByField(result.error!)).toEqual({ [field]: message })
})

test('a forged form without fields is refused field by field', () => {
  const result = signUpSchema.safeParse({})
  expect(Object.keys(faultsByField(result.error!)).sort()).toEqual(['email', 'name', 'password'])
})

test('an accent is the same password from every keyboard', () => {
  const parse = (password: string) => passwordSignInSchema.parse({ email: GOOD.email, password }).password
  expect(parse('caf\u0065\u0301')).toBe(parse('caf\u00e9'))
})

test('units and clock are of the known kinds', () => {
  const fields = {
    name: 'Anna',
    temperature: 'C',
    ice: 'in',
    water: 'gal',
    size: 'ft',
    wind: 'm/s',
    clock: '24',
    theme: 'dark',
  }
  const units = { temperature: 'C', ice: 'in', water: 'gal', size: 'ft', wind: 'm/s' }
  expect(accountSchema.parse(fields)).toEqual({ name: 'Anna', clock: '24', theme: 'dark', units })
  const faults = accountSchema.safeParse({ ...fields, ice: 'stone', wind: 'knots', clock: '25', theme: 'pink' }).error
  expect(faults?.issues.map(({ path }) => path[0])).toEqual(['ice', 'wind', 'clock', 'theme'])
})
