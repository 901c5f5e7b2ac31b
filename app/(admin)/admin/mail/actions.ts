'use server'

import { action } from '@/lib/action'
import { resendMail } from '@/lib/domain/mail/resend'
import { resendMailSchema } from '@/lib/schemas/administration'

export const resend = action(resendMailSchema, resendMail)
