import { z } from 'zod'
import { requiredText } from './quantity'

/** A code as somebody read it off a paper; dashes, spaces and case do not count. */
export const verifyCodeSchema = z.object({ code: requiredText('Code', 20) })
export type VerifyCode = z.infer<typeof verifyCodeSchema>

/** Bytes of an uploaded paper. A PDF of ours stays far below this. */
export const MAX_VERIFY_BYTES = 20 * 1024 * 1024
