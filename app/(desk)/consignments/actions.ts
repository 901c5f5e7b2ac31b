'use server'

import { action } from '@/lib/action'
import { answerCondition } from '@/lib/domain/consignments/answer-condition'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { cancelConsignment } from '@/lib/domain/consignments/cancel'
import { confirmAir } from '@/lib/domain/consignments/confirm-air'
import { deliverConsignment, departConsignment, stopConsignment } from '@/lib/domain/consignments/depart'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { submitConsignment } from '@/lib/domain/consignments/submit'
import { releaseConsignment } from '@/lib/domain/release/release'
import {
  cancelSchema,
  conditionAnswerSchema,
  confirmAirSchema,
  consignmentActSchema,
  deliverSchema,
  departSchema,
  stopJourneySchema,
} from '@/lib/schemas/act'
import { savePlanSchema } from '@/lib/schemas/plan'

export const savePlan = action(savePlanSchema, saveConsignment)
export const assess = action(consignmentActSchema, assessConsignment)
export const submit = action(consignmentActSchema, submitConsignment)
export const release = action(consignmentActSchema, releaseConsignment)
export const confirmAirOf = action(confirmAirSchema, confirmAir)
export const writeAnswer = action(conditionAnswerSchema, answerCondition)
export const cancel = action(cancelSchema, cancelConsignment)
export const depart = action(departSchema, departConsignment)
export const deliver = action(deliverSchema, deliverConsignment)
export const stop = action(stopJourneySchema, stopConsignment)
