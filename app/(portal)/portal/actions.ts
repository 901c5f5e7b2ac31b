'use server'

import { action } from '@/lib/action'
import { acknowledgeDocument } from '@/lib/domain/portal/acknowledge'
import { askChange } from '@/lib/domain/portal/ask-change'
import { acknowledgeSchema, askChangeSchema } from '@/lib/schemas/act'

export const acknowledge = action(acknowledgeSchema, acknowledgeDocument)
export const askForChange = action(askChangeSchema, askChange)
