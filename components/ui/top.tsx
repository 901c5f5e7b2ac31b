import type { ReactNode } from 'react'
import { Brand } from './brand'
import { NavLinks } from './nav-links'
import { NAVIGATION, ROLE_WORDS } from './navigation'
import type { NavLink, NavRole } from './navigation'
import { LightSwitch, UnitSwitch } from './preferences'
import { SignOutButton } from './sign-out-button'

export interface TopUser {
  name: string
  role: NavRole
}

/** The head of every page: mark, links of the role, unit, light, who is signed in; under it the vented slat. */
export function Top({
  user,
  links,
  words,
  home = '/',
}: {
  user?: TopUser
  /** Overrides the role's own links. */
  links?: readonly NavLink[]
  /** Stands at the right where nobody is signed in. */
  words?: ReactNode
  home?: string
}) {
  const shown = links ?? (user ? NAVIGATION[user.role] : [])
  // Two or three links stand in the open on a phone; more go into the menu.
  const few = shown.length > 1 && shown.length <= 3
  return (
    <header className="no-print">
      <a
        href="#main"
        className="absolute left-2 top-2 z-20 -translate-y-24 border border-hand bg-sheet px-3 py-2 text-hand focus:translate-y-0"
      >
        To the page
      </a>
      <div className="flex min-h-11 items-stretch gap-6 bg-sheet px-6 max-desk:px-4">
        <Brand href={home} />
        <div className="mr-auto hidden items-stretch board:flex">
          <NavLinks links={shown} label="Main" />
        </div>
        <div className="hidden items-center gap-4 text-small board:flex">
          <UnitSwitch />
          <LightSwitch />
          {user ? (
            <>
              <span>
                {user.name}, {ROLE_WORDS[user.role]}
              </span>
              <SignOutButton />
            </>
          ) : (
            <span className="text-mute">{words}</span>
          )}
        </div>
        <NarrowMenu user={user} links={few ? [] : shown} words={words} />
      </div>
      <Slat />
      {few && <NavLinks links={shown} label="Main, narrow" inRow />}
    </header>
  )
}

/** The rail under a head, vented at its end. No words ever stand on it. */
export function Slat() {
  return (
    <div aria-hidden="true" className="keep-ink relative h-[9px] bg-slat">
      <div className="vents absolute right-6 top-0.5 h-[5px] w-[236px] max-desk:right-4 max-desk:w-[115px]" />
    </div>
  )
}

function NarrowMenu({
  user,
  links,
  words,
}: {
  user?: TopUser
  links: readonly NavLink[]
  words?: ReactNode
}) {
  return (
    <details className="ml-auto flex items-center board:hidden">
      <summary className="flex min-h-11 items-center px-2 font-semibold text-hand underline underline-offset-2">
        Menu
      </summary>
      <div className="absolute inset-x-0 z-10 border-b-2 border-ink bg-sheet">
        {links.length > 0 && <NavLinks links={links} label="Main, narrow" stacked />}
        <div className="flex flex-wrap items-center gap-4 border-t border-rule px-4 py-3">
          <UnitSwitch />
          <LightSwitch />
          {user ? (
            <>
              <span>
                {user.name}, {ROLE_WORDS[user.role]}
              </span>
              <SignOutButton />
            </>
          ) : (
            <span className="text-mute">{words}</span>
          )}
        </div>
      </div>
    </details>
  )
}
