import type { ReactNode } from 'react'
import { SlatMark } from './brand'

const CAUTION =
  'A decision aid. It takes the place of no veterinarian, no acceptance rule of a carrier and no law of the countries crossed.'
const SLATS = [28, 188, 348, 508] as const
const POSTS = [96, 700, 1316] as const

/**
 * The page of signing in: the side of a crate, and the form a label pasted on it. Slats run on beyond 1440 px; on a narrow
 * screen the label stands under two slats.
 */
export function CrateSide({ firm, line, children }: { firm: string; line: string; children: ReactNode }) {
  return (
    <div className="relative overflow-x-clip min-[900px]:min-h-[700px]">
      <Slats />
      <div className="relative mx-auto max-w-[1440px] min-[900px]:min-h-[700px] min-[900px]:pb-8 min-[900px]:pt-[92px]">
        <SideWords firm={firm} line={line} />
        <NarrowSide />
        <div className="relative border-2 border-ink bg-sheet max-[899px]:border-x-0 min-[900px]:ml-auto min-[900px]:mr-6 min-[900px]:w-[440px] min-[1290px]:mr-[184px]">
          {children}
        </div>
      </div>
    </div>
  )
}

/** What is painted on the slats. */
function SideWords({ firm, line }: { firm: string; line: string }) {
  return (
    <div className="hidden min-[900px]:block">
      <p className="absolute left-[182px] top-[54px] font-head text-section font-bold">{firm}</p>
      <p className="absolute left-[182px] top-[84px] text-long max-board:hidden">{line}</p>
      <p
        aria-hidden="true"
        className="crate absolute left-[180px] top-[216px] text-[86px] leading-[72px] max-board:text-[56px] max-[1020px]:text-[40px]"
      >
        STEADFOLD
      </p>
      <p className="absolute left-[182px] top-[542px] max-w-[440px] max-board:max-w-[320px]">{CAUTION}</p>
    </div>
  )
}

/** Two slats above the label on a narrow screen. */
function NarrowSide() {
  return (
    <div className="min-[900px]:hidden">
      <div className="mt-3 flex items-center gap-2 border-y-2 border-ink bg-band px-4 py-4">
        <SlatMark width={34} />
        <span className="crate text-mark-phone">STEADFOLD</span>
      </div>
      <div aria-hidden="true" className="mt-3 h-7 border-t-2 border-ink bg-band" />
    </div>
  )
}

/** A ruled part of the label. */
export function LabelPart({ children }: { children: ReactNode }) {
  return (
    <div className="px-[22px] pb-[18px] pt-4 max-[899px]:px-4 [&+&]:border-t [&+&]:border-rule">
      {children}
    </div>
  )
}

function Slats() {
  return (
    <>
      <svg
        aria-hidden="true"
        className="absolute inset-0 hidden h-[700px] w-full min-[900px]:block"
        preserveAspectRatio="none"
      >
        {SLATS.map((y) => (
          <rect
            key={y}
            x="-4"
            y={y}
            width="110%"
            height="128"
            strokeWidth="2"
            className="fill-band stroke-ink"
          />
        ))}
        <line x1="0" x2="100%" y1="667" y2="667" strokeWidth="2" className="stroke-ink" />
      </svg>
      <div className="absolute inset-x-0 top-0 mx-auto hidden max-w-[1440px] min-[900px]:block">
        <svg aria-hidden="true" width="1440" height="668" className="block max-w-none">
          {POSTS.map((x) => (
            <Post key={x} x={x} />
          ))}
          {Array.from({ length: 11 }, (_, index) => (
            <circle
              key={index}
              cx={204 + index * 46}
              cy="412"
              r="15"
              strokeWidth="2"
              className="fill-ground stroke-ink"
            />
          ))}
        </svg>
      </div>
    </>
  )
}

function Post({ x }: { x: number }) {
  return (
    <>
      <rect x={x} y="-4" width="52" height="671" strokeWidth="2" className="fill-sheet stroke-ink" />
      {SLATS.flatMap((y) => [y + 26, y + 102]).map((cy) => (
        <circle key={cy} cx={x + 26} cy={cy} r="4" strokeWidth="1.5" className="fill-none stroke-ink" />
      ))}
    </>
  )
}
