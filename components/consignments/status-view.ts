import type { ConsignmentState } from '@/lib/states/consignment'

/** How far the worker is with a consignment, as the handler answers it. */
export interface ConsignmentStatusView {
  assessment: {
    assessmentId: number
    status: 'queued' | 'running' | 'done' | 'failed' | 'superseded'
    stage: string
    done: number
    total: number
    /** Why it failed, in words. */
    error: string
  } | null
  /** The papers of a release are being made. */
  releasing: boolean
  releaseError: string
  row: { state: ConsignmentState; outOfDate: boolean }
}

/** What somebody may do with the consignment now; the verb asks again. */
export type DeskAct = 'save' | 'assess' | 'submit' | 'release' | 'depart' | 'deliver' | 'stop' | 'cancel'
