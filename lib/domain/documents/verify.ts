import 'server-only'
import { createHash } from 'node:crypto'
import { typedCode, printedCode } from '@/lib/documents/code'
import { readDocumentCode } from '@/lib/documents/verify'
import { SteadfoldError } from '@/lib/errors'
import { MAX_VERIFY_BYTES } from '@/lib/schemas/verify'
import type { VerifyCode } from '@/lib/schemas/verify'
import type { PaperState, VerificationView } from '@/lib/views/verification'
import { models } from '@/models'
import type { Document } from '@/models'
import { record } from '../audit/record'
import { deskMoment } from '../firm'
import { VERIFY_THROTTLE, claimAttempt, throttled } from '../throttle'

/** Who asks: nobody needs to sign in, so all that is known is where the request came from. */
export interface Visitor {
  ip: string | null
}

/** What a code on a paper is worth. Never says whose animals it is about. */
export async function verifyCode(visitor: Visitor, input: VerifyCode, now: Date): Promise<VerificationView> {
  await admit(visitor, now)
  const code = typedCode(input.code)
  const paper = code === null ? null : await models.Document.findOne({ where: { code } })
  return answer(visitor, now, {
    by: 'code',
    code: code === null ? null : printedCode(code),
    state: paper?.state ?? 'unknown',
    paper,
  })
}

/** What a file is worth, to the last byte. A code of ours in other bytes is not as issued. */
export async function verifyFile(visitor: Visitor, bytes: Uint8Array, now: Date): Promise<VerificationView> {
  await admit(visitor, now)
  if (bytes.byteLength > MAX_VERIFY_BYTES) {
    throw new SteadfoldError('invalid', 'This file is larger than any paper of ours (20 MB at most).')
  }
  if (!isPdf(bytes)) throw new SteadfoldError('invalid', 'This file is not a PDF.')
  const sha256 = createHash('sha256').update(bytes).digest('hex')
  const issued = await models.Document.findOne({ where: { sha256 } })
  if (issued !== null) {
    return answer(visitor, now, {
      by: 'file',
      code: printedCode(issued.code),
      state: issued.state,
      paper: issued,
    })
  }
  const code = readDocumentCode(bytes)
  const claimed = code === null ? null : await models.Document.findOne({ where: { code } })
  return answer(visitor, now, {
    by: 'file',
    code: code === null ? null : printedCode(code),
    state: claimed === null ? 'unknown' : 'not-as-issued',
    paper: claimed,
  })
}

/** Every attempt counts, right or wrong: codes are there to be read off a paper, not tried. */
async function admit(visitor: Visitor, now: Date) {
  const place = visitor.ip === null ? 'unknown' : networkOf(visitor.ip)
  const claim = await claimAttempt(VERIFY_THROTTLE, place, now)
  if (!claim.free)
    throw throttled(claim.closedUntil, 'Too many papers were checked from here. Wait a few minutes.')
}

/** One place: an IPv4 address, or the /64 a household or a machine is given of IPv6 and may choose from freely. */
function networkOf(ip: string): string {
  if (!ip.includes(':')) return ip
  const [head = '', tail] = ip.split('::')
  const groups = head === '' ? [] : head.split(':')
  const after = tail === undefined || tail === '' ? [] : tail.split(':')
  const zeros = tail === undefined ? 0 : Math.max(0, 8 - groups.length - after.length)
  const all = [...groups, ...Array<string>(zeros).fill('0'), ...after]
  return `${all
    .slice(0, 4)
    .map((group) => Number.parseInt(group, 16).toString(16))
    .join(':')}::/64`
}

async function answer(
  visitor: Visitor,
  now: Date,
  found: { by: 'code' | 'file'; code: string | null; state: PaperState; paper: Document | null },
): Promise<VerificationView> {
  const { by, code, state, paper } = found
  await record(null, {
    actor: null,
    verb: 'document.verify',
    at: now,
    subject: { type: 'document', id: paper?.id ?? null },
    consignmentId: paper?.consignmentId ?? null,
    note: `${state}, by ${by}${visitor.ip === null ? '' : `, from ${visitor.ip}`}`,
  })
  return {
    state,
    code,
    by,
    checked: deskMoment(now),
    paper: paper && {
      kind: paper.kind,
      sheets: paper.pageCount,
      revision: paper.revision,
      latestRevision: await latestRevision(paper),
      made: deskMoment(paper.madeAt),
      stateChanged: paper.stateChangedAt && deskMoment(paper.stateChangedAt),
      planHashStart: paper.planHash.slice(0, 16),
    },
  }
}

async function latestRevision({ consignmentId, kind, revision }: Document): Promise<number> {
  const latest = await models.Document.max<number, Document>('revision', { where: { consignmentId, kind } })
  return latest ?? revision
}

function isPdf(bytes: Uint8Array): boolean {
  return Buffer.from(bytes.subarray(0, 1024)).toString('latin1').includes('%PDF-')
}
