// What people type about themselves.
import { z } from 'zod'
import { UNIT_CHOICES, type UnitName } from '@/lib/units'
import { deviceIdSchema } from './alerts'
import { lineOfText } from './fields'
import { MIN_PASSWORD_LENGTH } from './password-length'
import { THEMES } from './themes'

export const emailSchema = z
  .string('Type your e-mail address.')
  .trim()
  .toLowerCase()
  .min(1, 'Type your e-mail address.')
  .max(254, 'That address is too long.')
  .pipe(z.email('That does not look like an e-mail address: name@example.org'))

const nameSchema = lineOfText('Type your name.', 80)

/** Composed and decomposed accents are the same password, whatever keyboard typed it. */
const passwordOf = (text: z.ZodString) =>
  text.max(200, 'At most 200 characters.').transform((password) => password.normalize('NFC'))

const givenPasswordSchema = passwordOf(z.string('Type your password.').min(1, 'Type your password.'))
const newPasswordSchema = passwordOf(
  z.string('Choose a password.').min(MIN_PASSWORD_LENGTH, `At least ${MIN_PASSWORD_LENGTH} characters.`),
)
/** Absent where there is none. Whoever finds a phone unlocked shall not take the account along. */
const presentPasswordSchema = z.string().default('').pipe(passwordOf(z.string()))

const keySchema = z.string('This link is not complete.').max(200, 'This link is not complete.')

export const signUpSchema = z.object({ name: nameSchema, email: emailSchema, password: newPasswordSchema })
/** With the page to come back to. */
export const signUpFormSchema = signUpSchema.extend({ next: z.string().optional() })
export const passwordSignInSchema = z.object({ email: emailSchema, password: givenPasswordSchema })
/** One form with two buttons: the password counts only for one of them. */
export const signInFormSchema = z.object({
  by: z.enum(['password', 'link']).default('password'),
  email: emailSchema,
  password: z.string().default(''),
  next: z.string().optional(),
})
export const mailRequestSchema = z.object({ email: emailSchema })
export const linkSchema = z.object({ key: keySchema })
export const newPasswordByLinkSchema = z.object({ key: keySchema, password: newPasswordSchema })
export const passwordChangeSchema = z.object({
  // Absent for people who have only ever signed in by link.
  currentPassword: presentPasswordSchema,
  newPassword: newPasswordSchema,
})
const unitSchema = <Name extends UnitName>(name: Name) => z.enum(UNIT_CHOICES[name], 'Choose one of the units offered.')

export const accountSchema = z
  .object({
    name: nameSchema,
    temperature: unitSchema('temperature'),
    ice: unitSchema('ice'),
    water: unitSchema('water'),
    size: unitSchema('size'),
    wind: unitSchema('wind'),
    clock: z.enum(['12', '24'], 'Choose a 12-hour or a 24-hour clock.'),
    theme: z.enum(THEMES, 'Choose one of these looks.'),
  })
  .transform(({ name, clock, theme, ...units }) => ({ name, clock, theme, units }))

/** Without a device the test goes by mail. */
export const testSchema = z.object({ deviceId: deviceIdSchema.optional() })
export const ownDeviceSchema = z.object({ deviceId: deviceIdSchema })
export const testIdSchema = z.uuid('That is no test.')

export const emailChangeSchema = z.object({ email: emailSchema, currentPassword: presentPasswordSchema })
export const deletionSchema = z.object({ currentPassword: presentPasswordSchema })
export const endSessionSchema = z.object({ handle: z.string().regex(/^[0-9a-f]{16}$/, 'That is no session.') })

export type TestInput = z.output<typeof testSchema>
export type EmailChangeInput = z.output<typeof emailChangeSchema>
export type DeletionInput = z.output<typeof deletionSchema>
export type SignUpInput = z.output<typeof signUpSchema>
export type PasswordSignInInput = z.output<typeof passwordSignInSchema>
export type MailRequestInput = z.output<typeof mailRequestSchema>
export type NewPasswordByLinkInput = z.output<typeof newPasswordByLinkSchema>
export type PasswordChangeInput = z.output<typeof passwordChangeSchema>
export type AccountInput = z.output<typeof accountSchema>
