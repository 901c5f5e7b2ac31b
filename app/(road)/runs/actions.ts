'use server'

import { action } from '@/lib/action'
import { deliverConsignment, departConsignment, stopConsignment } from '@/lib/domain/consignments/depart'
import { deliverSchema, departSchema, stopJourneySchema } from '@/lib/schemas/act'

export const depart = action(departSchema, departConsignment)
export const deliver = action(deliverSchema, deliverConsignment)
export const stop = action(stopJourneySchema, stopConsignment)
