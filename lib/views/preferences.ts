/** What a person chose for this browser: unit and light. Kept in two cookies, so that the first byte is already right. */
export type TempUnit = 'c' | 'f'
export type LightChoice = 'day' | 'night' | 'system'

export interface Preferences {
  unit: TempUnit
  light: LightChoice
}

export const UNIT_COOKIE = 'steadfold-unit'
export const LIGHT_COOKIE = 'steadfold-light'

/** Preferences from raw cookie values; anything unknown falls back to °C and the device's light. */
export function preferencesFrom(unit: string | undefined, light: string | undefined): Preferences {
  return {
    unit: unit === 'f' ? 'f' : 'c',
    light: light === 'day' || light === 'night' ? light : 'system',
  }
}
