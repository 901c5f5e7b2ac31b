/** A machine that heats or cools a space. Watts nobody gave are null: not known is not none. */
export interface ClimateControl {
  setPointC: number | null
  coolingW: number | null
  heatingW: number | null
}

/**
 * What a machine can do about its set-point: keep it from both sides, from above alone, from below alone, or nothing
 * (no machine, no watts, or watts nobody gave).
 */
export type Control = 'both' | 'cooling' | 'heating' | 'none'

/** Which way a space can be driven; a set-point alone moves no air. */
export function controlOf(machine: ClimateControl | null | undefined): Control {
  if (machine == null || machine.coolingW === null || machine.heatingW === null) return 'none'
  if (machine.coolingW > 0) return machine.heatingW > 0 ? 'both' : 'cooling'
  return machine.heatingW > 0 ? 'heating' : 'none'
}

/**
 * "set to 18 °C", "cooled to at most 18 °C", "heated to at least 18 °C"; null where nothing drives the air. Whether the
 * watts suffice is for the engine to say.
 */
export function controlWords(control: Control, setPoint: string): string | null {
  switch (control) {
    case 'both':
      return `set to ${setPoint}`
    case 'cooling':
      return `cooled to at most ${setPoint}`
    case 'heating':
      return `heated to at least ${setPoint}`
    case 'none':
      return null
  }
}
