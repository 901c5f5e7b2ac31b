import { swatch } from '@/lib/views/charts/hatch'
import type { SurroundingsPattern } from '@/lib/views/sheet'
import { PaperPicture } from './picture'

const BOX = { x: 0, y: 0, width: 24, height: 15 }

/** A small window on a leg's surroundings. */
export function Swatch({ pattern }: { pattern: SurroundingsPattern }) {
  return (
    <PaperPicture
      picture={{ width: BOX.width, height: BOX.height, marks: swatch(pattern, BOX, { scale: 0.8 }) }}
    />
  )
}
