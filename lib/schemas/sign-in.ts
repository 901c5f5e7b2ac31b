import { z } from 'zod'

/** An address is compared in lower case; a password is never trimmed. */
export const emailAddress = z
  .string({ error: 'E-mail address is missing.' })
  .trim()
  .toLowerCase()
  .min(1, { error: 'E-mail address is missing.' })
  .max(200, { error: 'E-mail address: put at most 200 characters.' })
  .refine((value) => value === '' || z.email().safeParse(value).success, {
    error: (issue) => `E-mail “${String(issue.input)}” is not an address.`,
  })

/** A password as typed at sign-in or before signing. The message never repeats it. */
export const typedPassword = z
  .string({ error: 'Password is missing.' })
  .min(1, { error: 'Password is missing.' })
  .max(200, { error: 'Password: put at most 200 characters.' })

export const signInSchema = z.object({ email: emailAddress, password: typedPassword })
export type SignIn = z.infer<typeof signInSchema>
