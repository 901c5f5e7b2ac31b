'use server'

import { action } from '@/lib/action'
import { assessConsignment } from '@/lib/domain/consignments/assess'
import { saveConsignment } from '@/lib/domain/consignments/save'
import { consignmentActSchema } from '@/lib/schemas/act'
import { savePlanSchema } from '@/lib/schemas/plan'

export const savePlan = action(savePlanSchema, saveConsignment)
export const assess = action(consignmentActSchema, assessConsignment)
