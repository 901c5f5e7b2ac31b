'use client'

import { useRouter } from 'next/navigation'
import { createContext, useContext, useEffect, useMemo, useState, useTransition } from 'react'
import type { ReactNode } from 'react'
import { LIGHT_COOKIE, UNIT_COOKIE } from '@/lib/views/preferences'
import type { LightChoice, Preferences, TempUnit } from '@/lib/views/preferences'

interface PreferencesInHand extends Preferences {
  setUnit: (unit: TempUnit) => void
  setLight: (light: LightChoice) => void
}

const Context = createContext<PreferencesInHand | null>(null)

/** Starts from the cookies the server read; a choice is written to cookie and local storage, then the page is asked again. */
export function PreferencesProvider({ initial, children }: { initial: Preferences; children: ReactNode }) {
  const router = useRouter()
  const [preferences, setPreferences] = useState(initial)
  const [, startTransition] = useTransition()

  // A browser that dropped its cookies but kept its storage gets its choice back.
  useEffect(() => restore(setPreferences), [])

  useEffect(() => {
    document.documentElement.dataset.theme = preferences.light
  }, [preferences.light])

  const value = useMemo<PreferencesInHand>(
    () => ({
      ...preferences,
      setUnit: (unit) => {
        keep(UNIT_COOKIE, unit)
        setPreferences((before) => ({ ...before, unit }))
        startTransition(() => router.refresh())
      },
      setLight: (light) => {
        keep(LIGHT_COOKIE, light)
        setPreferences((before) => ({ ...before, light }))
      },
    }),
    [preferences, router],
  )
  return <Context value={value}>{children}</Context>
}

/** Unit and light in force, and the two ways to change them. */
export function usePreferences(): PreferencesInHand {
  return useContext(Context) ?? { unit: 'c', light: 'system', setUnit: ignore, setLight: ignore }
}

/** The unit in force; °C outside a provider. */
export function useUnit(): TempUnit {
  return usePreferences().unit
}

export function UnitSwitch() {
  const { unit, setUnit } = usePreferences()
  return (
    <Switch
      label="Unit"
      value={unit}
      onChange={setUnit}
      options={[
        { value: 'c', words: '°C' },
        { value: 'f', words: '°F' },
      ]}
    />
  )
}

export function LightSwitch() {
  const { light, setLight } = usePreferences()
  return (
    <Switch
      label="Light"
      value={light}
      onChange={setLight}
      options={[
        { value: 'day', words: 'Day' },
        { value: 'night', words: 'Night' },
        { value: 'system', words: 'Device' },
      ]}
    />
  )
}

/** A few words in one frame; the one in force is ink with a foot, the others violet. */
function Switch<T extends string>({
  label,
  value,
  options,
  onChange,
}: {
  label: string
  value: T
  options: readonly { value: T; words: string }[]
  onChange: (value: T) => void
}) {
  return (
    <span role="group" aria-label={label} className="inline-flex border border-rule">
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          aria-pressed={option.value === value}
          onClick={() => onChange(option.value)}
          className="cursor-pointer border-b-3 border-transparent px-2 pt-[3px] text-small text-hand max-desk:min-h-11 max-desk:px-3 aria-pressed:border-ink aria-pressed:font-semibold aria-pressed:text-ink"
        >
          {option.words}
        </button>
      ))}
    </span>
  )
}

function restore(set: (change: (before: Preferences) => Preferences) => void): void {
  const has = (name: string) => document.cookie.split('; ').some((entry) => entry.startsWith(`${name}=`))
  const kept = (name: string) => (has(name) ? null : read(name))
  const unit = kept(UNIT_COOKIE)
  const light = kept(LIGHT_COOKIE)
  if (unit !== 'c' && unit !== 'f' && light !== 'day' && light !== 'night') return
  if (unit) keep(UNIT_COOKIE, unit)
  if (light) keep(LIGHT_COOKIE, light)
  set((before) => ({
    unit: unit === 'c' || unit === 'f' ? unit : before.unit,
    light: light === 'day' || light === 'night' ? light : before.light,
  }))
}

function keep(name: string, value: string): void {
  document.cookie = `${name}=${value}; path=/; max-age=31536000; samesite=lax`
  try {
    localStorage.setItem(name, value)
  } catch {
    // Storage can be forbidden; the cookie alone does.
  }
}

function read(name: string): string | null {
  try {
    return localStorage.getItem(name)
  } catch {
    return null
  }
}

function ignore(): void {}
