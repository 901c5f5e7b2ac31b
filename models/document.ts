import { Model } from 'sequelize'
import type {
  CreationOptional,
  InferAttributes,
  InferCreationAttributes,
  NonAttribute,
  Sequelize,
} from 'sequelize'
import type { Acknowledgement } from './acknowledgement'
import type { Consignment } from './consignment'
import {
  bytes,
  count,
  fixedText,
  hash,
  key,
  link,
  moment,
  oneOf,
  optional,
  smallCount,
  text,
  withDefault,
} from './columns'

export const DOCUMENT_KINDS = ['go_no_go', 'manifest'] as const
export type DocumentKind = (typeof DOCUMENT_KINDS)[number]
export const DOCUMENT_STATES = ['current', 'superseded', 'void'] as const
export type DocumentState = (typeof DOCUMENT_STATES)[number]

/** A PDF as issued, to the byte. */
export class Document extends Model<InferAttributes<Document>, InferCreationAttributes<Document>> {
  declare id: CreationOptional<number>
  declare consignmentId: number
  declare revision: number
  declare kind: DocumentKind
  /** Eight characters without I, O, 0, 1. */
  declare code: string
  declare state: CreationOptional<DocumentState>
  /** The file as issued; the default scope leaves it out. */
  declare bytes: Buffer
  declare sha256: string
  declare planHash: string
  declare viewHash: string
  declare sizeBytes: number
  declare pageCount: number
  declare madeAt: Date
  declare madeBy: number
  declare stateChangedAt: Date | null
  declare voidedReason: string | null

  declare consignment?: NonAttribute<Consignment>
  declare acknowledgement?: NonAttribute<Acknowledgement | null>
}

export function initDocument(sequelize: Sequelize): typeof Document {
  return Document.init(
    {
      id: key(),
      consignmentId: link(),
      revision: count(),
      kind: oneOf(DOCUMENT_KINDS),
      code: fixedText(8),
      state: withDefault(oneOf(DOCUMENT_STATES), 'current'),
      bytes: bytes(),
      sha256: hash(),
      planHash: hash(),
      viewHash: hash(),
      sizeBytes: count(),
      pageCount: smallCount(),
      madeAt: moment(),
      madeBy: link(),
      stateChangedAt: optional(moment()),
      voidedReason: optional(text(500)),
    },
    {
      sequelize,
      modelName: 'Document',
      tableName: 'documents',
      timestamps: false,
      defaultScope: { attributes: { exclude: ['bytes'] } },
    },
  )
}
