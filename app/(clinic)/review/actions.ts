'use server'

import { action } from '@/lib/action'
import { approveCrates } from '@/lib/domain/approvals/approve'
import { returnCrates } from '@/lib/domain/approvals/return'
import { withdrawApproval } from '@/lib/domain/approvals/withdraw'
import { approveSchema, returnSchema, withdrawSchema } from '@/lib/schemas/approval'

export const approve = action(approveSchema, approveCrates)
export const sendBack = action(returnSchema, returnCrates)
export const withdraw = action(withdrawSchema, withdrawApproval)
