import { View } from '@react-pdf/renderer'
import type { ReactNode } from 'react'
import { INK, px, Words } from './words'

/** A column of a ruled table; width in pixels. `joined` leaves out the hairline before it. */
export interface Column {
  head: ReactNode
  width: number
  align?: 'left' | 'right' | 'center'
  joined?: boolean
  pad?: number
}

export interface LedgerRow {
  key: string
  height: number
  cells: ReactNode[]
}

export const LEDGER_HEAD = 17

/** A ruled table: thick rules above and below, hairlines between. Rows have their height given, so that sheets are planned. */
export function Ledger({
  columns,
  rows,
  headHeight = LEDGER_HEAD,
}: {
  columns: Column[]
  rows: LedgerRow[]
  headHeight?: number
}) {
  return (
    <View style={{ borderTopWidth: px(1.5), borderBottomWidth: px(1.5), borderColor: INK.ink }}>
      <View
        style={{
          flexDirection: 'row',
          height: px(headHeight),
          borderBottomWidth: px(1),
          borderBottomColor: INK.ink,
        }}
      >
        {columns.map((column, index) => (
          <View
            key={index}
            style={{ ...cellStyle(column, index), justifyContent: 'flex-end', paddingBottom: px(2) }}
          >
            {typeof column.head === 'string' ? (
              <Words size={10} line={12} weight={600} style={{ textAlign: column.align ?? 'left' }}>
                {column.head}
              </Words>
            ) : (
              column.head
            )}
          </View>
        ))}
      </View>
      {rows.map((row, index) => (
        <View
          key={row.key}
          style={{ flexDirection: 'row', height: px(row.height), ...(index > 0 ? hairAbove : {}) }}
        >
          {columns.map((column, at) => (
            <View key={at} style={{ ...cellStyle(column, at), justifyContent: 'center' }}>
              <Cell align={column.align ?? 'left'}>{row.cells[at]}</Cell>
            </View>
          ))}
        </View>
      ))}
    </View>
  )
}

/** Height of a whole table in pixels. */
export function ledgerHeight(rows: readonly { height: number }[], headHeight = LEDGER_HEAD): number {
  return 3 + headHeight + rows.reduce((sum, { height }) => sum + height, 0)
}

const hairAbove = { borderTopWidth: px(0.75), borderTopColor: INK.hair }

function cellStyle({ width, joined = false, pad = 5, align = 'left' }: Column, index: number) {
  const ruled = index > 0 && !joined
  return {
    width: px(width),
    paddingHorizontal: px(pad),
    alignItems: align === 'right' ? 'flex-end' : align === 'center' ? 'center' : 'flex-start',
    ...(ruled ? { borderLeftWidth: px(0.75), borderLeftColor: INK.hair } : {}),
  } as const
}

function Cell({ children, align }: { children: ReactNode; align: 'left' | 'right' | 'center' }) {
  if (typeof children !== 'string') return children
  return (
    <Words size={11} line={13.5} style={{ textAlign: align }}>
      {children}
    </Words>
  )
}

/** Ordinal of a row, in the head face. */
export function Ordinal({ children, size = 14 }: { children: number; size?: number }) {
  return (
    <Words face="head" weight={700} size={size} line={size + 2}>
      {String(children)}
    </Words>
  )
}
