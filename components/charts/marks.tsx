import type { CSSProperties } from 'react'
import type { ChartInk, Look, Mark } from '@/lib/views/charts/marks'

/** Draws marks as SVG. Inks are custom properties, so that night, paper and forced colours follow by themselves. */
export function Marks({ marks }: { marks: readonly Mark[] }) {
  return marks.map((mark, index) => <OneMark key={index} mark={mark} />)
}

function OneMark({ mark }: { mark: Mark }) {
  switch (mark.kind) {
    case 'path':
      return <path d={mark.d} style={looks(mark)} />
    case 'rect':
      return <rect x={mark.x} y={mark.y} width={mark.width} height={mark.height} style={looks(mark)} />
    case 'circle':
      return <circle cx={mark.x} cy={mark.y} r={mark.r} style={looks(mark)} />
    case 'text':
      return (
        <text
          x={mark.x}
          y={mark.y}
          textAnchor={mark.anchor}
          style={{
            fontFamily: `var(--f-${mark.face})`,
            fontSize: mark.size,
            fontWeight: mark.weight,
            fill: ink(mark.ink),
            wordSpacing: mark.face === 'fig' ? '-.28em' : undefined,
            fontVariantNumeric: mark.face === 'text' ? 'tabular-nums' : undefined,
          }}
        >
          {mark.text}
        </text>
      )
  }
}

function looks(look: Look): CSSProperties {
  return {
    fill: ink(look.fill ?? 'none'),
    fillOpacity: look.fillOpacity,
    stroke: look.stroke ? ink(look.stroke) : undefined,
    strokeWidth: look.strokeWidth,
    strokeOpacity: look.strokeOpacity,
    strokeDasharray: look.dash?.join(' '),
    strokeLinecap: look.roundCap ? 'round' : undefined,
  }
}

function ink(name: ChartInk): string {
  return name === 'none' ? 'none' : `var(--${name})`
}
