import 'server-only'
import { seal } from '@/lib/documents/seal'
import { renderManifest, renderSheet } from '@/lib/documents/render'
import { firm } from '@/lib/domain/firm'
import { prepareRelease } from '@/lib/domain/release/prepare'
import type { PreparedRelease } from '@/lib/domain/release/prepare'
import { recordRelease } from '@/lib/domain/release/record'
import type { IssuedPaper, IssuedRelease } from '@/lib/domain/release/record'
import { env } from '@/lib/env'
import { SteadfoldError } from '@/lib/errors'
import { manifestLetter } from '@/lib/mail/letters/manifest-letter'
import type { Signer } from '@/lib/documents/seal'
import { signer, signingIdentity } from '@/lib/signing'
import { buildManifestView } from '@/lib/views/manifest-view/build-manifest-view'
import { buildSheetView } from '@/lib/views/sheet-view/build-sheet-view'
import { models } from '@/models'

/** Somebody who saves again and again while papers are made has more to say: the release is asked for once that is done. */
const TURNS = 3

/**
 * Makes the papers of one release and records them: rendering and sealing come before the transaction that records,
 * which looks at everything again. Made anew where the consignment was written to meanwhile. Done twice, it is recorded
 * once.
 */
export async function releaseJob(payload: unknown, clock: () => Date): Promise<void> {
  for (let turn = 1; turn <= TURNS; turn += 1) {
    const prepared = await prepareRelease(payload, clock())
    if (prepared === null) return
    const issued = await issue(prepared, clock())
    if ((await recordRelease(prepared, issued, clock())) !== 'changed') return
  }
  throw new SteadfoldError(
    'conflict',
    'The consignment was changed while its papers were being made. Release it again once nobody is saving.',
  )
}

async function issue(prepared: PreparedRelease, now: Date): Promise<IssuedRelease> {
  const holder = await signer()
  const sheet = await sheetPaper(prepared, holder)
  const { paper: manifest, view } = await manifestPaper(prepared, holder, now)
  const letter = { to: prepared.shipperEmail, ...manifestLetter(view, { appUrl: env().appUrl }) }
  return { papers: [sheet, manifest], letter }
}

async function sheetPaper({ sheet }: PreparedRelease, holder: Signer): Promise<IssuedPaper> {
  // The sheet speaks of the release it is part of: its edge would say that nothing is released.
  const view = buildSheetView({ ...sheet, consignment: { ...sheet.consignment, state: 'released' } })
  const { bytes, pages } = await renderSheet(view)
  const sealed = await seal(bytes, holder, sealing('Go/no-go sheet as released', sheet.madeAtMs))
  return { kind: 'go_no_go', code: sheet.documentCode ?? '', bytes: sealed, pages, view }
}

async function manifestPaper(
  { manifest, releasedBy, shipperEmail }: PreparedRelease,
  holder: Signer,
  now: Date,
) {
  const code = manifest.documentCode ?? ''
  const { subject, serial, validToMs, selfIssued } = await signingIdentity()
  const view = buildManifestView({
    ...manifest,
    documentCode: code,
    verifyUrl: `${env().appUrl}/verify/${code}`,
    releasedBy: `${releasedBy.name}, ${releasedBy.role}`,
    releasedAtMs: now.getTime(),
    shipperEmail,
    vetOnCall: await vetOnCall(manifest.consignment.id, manifest.consignment.planHash),
    crateModels: (await models.CrateModel.findAll({ attributes: ['id', 'name'] })).map(({ id, name }) => ({
      id,
      name,
    })),
    seal: { subject, serial, validToMs, selfIssued },
  })
  const { bytes, pages } = await renderManifest(view)
  const sealed = await seal(bytes, holder, sealing('Manifest as released', manifest.madeAtMs))
  const paper: IssuedPaper = { kind: 'manifest', code, bytes: sealed, pages, view }
  return { paper, view }
}

function sealing(reason: string, atMs: number) {
  const { name, town, deskTelephone } = firm()
  return { reason: `${reason} by ${name}`, contact: deskTelephone, location: town, at: new Date(atMs) }
}

/** The vet who signed last is the one to ring. */
async function vetOnCall(consignmentId: number, planHash: string) {
  const approval = await models.Approval.findOne({
    where: { consignmentId, planHash, voidedAt: null },
    order: [['id', 'DESC']],
  })
  const vet =
    approval && (await models.User.findByPk(approval.signerId, { attributes: ['name', 'telephone'] }))
  return vet && { name: vet.name, telephone: vet.telephone }
}
