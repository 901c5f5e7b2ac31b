'use client'

import { useCallback, useState } from 'react'
import type { Plan } from '@/lib/schemas/plan'
import { spotOf, planPathId } from './plan-path'
import type { PlanPart } from './plan-path'

/** Which parts stand open, which animal, crate and leg is in hand, and the way from a reason to its field. */
export function useOpenParts(plan: Plan) {
  // A new plan begins where people begin: who, then which animals. A plan with legs begins folded.
  const [opened, setOpened] = useState<readonly PlanPart[]>(
    plan.legs.length > 0 ? [] : ['parties', 'animals', 'crates'],
  )
  const [animal, chooseAnimal] = useState(0)
  const [crate, chooseCrate] = useState(0)
  const [leg, chooseLeg] = useState(0)

  const toggle = useCallback((part: PlanPart) => {
    setOpened((before) =>
      before.includes(part) ? before.filter((known) => known !== part) : [...before, part],
    )
  }, [])

  const open = useCallback((part: PlanPart) => {
    if (part !== 'legs') setOpened((before) => (before.includes(part) ? before : [...before, part]))
    afterPaint(() => document.getElementById(part === 'legs' ? 'legs' : `open-${part}`)?.scrollIntoView())
  }, [])

  const goTo = useCallback((path: string) => {
    const { part, index } = spotOf(path)
    if (part !== 'legs') setOpened((before) => (before.includes(part) ? before : [...before, part]))
    if (index !== null) {
      if (part === 'animals') chooseAnimal(index)
      if (part === 'crates') chooseCrate(index)
      if (part === 'legs') chooseLeg(index)
    }
    afterPaint(() => focusPath(path, part))
  }, [])

  return { opened, animal, crate, leg, chooseAnimal, chooseCrate, chooseLeg, toggle, open, goTo }
}

/** The parts that were just opened exist only after React has drawn them. */
function afterPaint(work: () => void) {
  requestAnimationFrame(() => requestAnimationFrame(work))
}

/** Focus on the field of a path, or on the nearest thing above it that stands on the page. */
function focusPath(path: string, part: PlanPart) {
  const keys = path.split('.')
  for (let length = keys.length; length > 0; length -= 1) {
    const field = document.getElementById(planPathId(keys.slice(0, length).join('.')))
    if (field === null) continue
    field.scrollIntoView({ block: 'center' })
    const control = field.matches('input,select,textarea,button')
      ? field
      : field.querySelector<HTMLElement>('input,select,textarea,button')
    ;(control ?? field).focus({ preventScroll: true })
    return
  }
  document.getElementById(part === 'legs' ? 'legs' : `open-${part}`)?.scrollIntoView()
}
