import * as z from 'zod/mini'
import { NAME_MAX, requiredText } from './primitives'

/** Shortest and longest password, in characters after NFC. */
export const PASSWORD_MIN = 10
export const PASSWORD_MAX = 256
export const EMAIL_MAX = 254

/** One mailbox, lower-cased and trimmed before it is stored. */
export const emailSchema = z.string().check(
  z.maxLength(EMAIL_MAX, 'is too long'),
  z.regex(/^[^\s@,;<>"]+@[^\s@,;<>"]+\.[^\s@,;<>"]+$/, 'is not an e-mail address'),
)

export const signUpSchema = z.strictObject({
  email: emailSchema,
  displayName: requiredText(NAME_MAX),
  password: z.string().check(
    z.minLength(PASSWORD_MIN, `is shorter than ${PASSWORD_MIN} characters`),
    z.maxLength(PASSWORD_MAX, `is longer than ${PASSWORD_MAX} characters`),
  ),
})
export type SignUp = z.infer<typeof signUpSchema>

export const signInSchema = z.strictObject({
  email: z.string().check(z.maxLength(EMAIL_MAX, 'is too long')),
  password: z.string().check(z.maxLength(PASSWORD_MAX, 'is too long')),
})
export type SignIn = z.infer<typeof signInSchema>

/** What the app knows of the person signed in. */
export type Account = { id: string, displayName: string, email: string }
