import Link from 'next/link'
import type { ComponentProps, ReactNode } from 'react'
import { join } from './join'

type Size = 'desk' | 'phone'

export interface ButtonLook {
  /** The one main act of a part: filled violet. */
  first?: boolean
  /** phone: 56 px high, for the cab. */
  size?: Size
  /** Why it can't be pressed. The button stays in the tab order, says so, and does nothing. */
  refused?: string
}

/** A button is a verb that names its result: "Sign crate 2417-A". */
export function Button({
  first,
  size,
  refused,
  className,
  type = 'button',
  onClick,
  ...rest
}: ButtonLook & ComponentProps<'button'>) {
  return (
    <button
      {...rest}
      type={refused ? 'button' : type}
      onClick={refused ? undefined : onClick}
      aria-disabled={refused ? true : undefined}
      title={refused}
      className={join(buttonClass({ first, size, refused: Boolean(refused) || rest.disabled }), className)}
    />
  )
}

/** A link that looks like a button because it begins an act. */
export function ButtonLink({
  first,
  size,
  className,
  ...rest
}: Omit<ButtonLook, 'refused'> & ComponentProps<typeof Link>) {
  return <Link {...rest} className={join(buttonClass({ first, size }), className)} />
}

export function buttonClass({
  first = false,
  size = 'desk',
  refused = false,
}: {
  first?: boolean
  size?: Size
  refused?: boolean
}): string {
  return join(
    'inline-flex cursor-pointer items-center justify-center gap-2 border text-center font-semibold no-underline desk:whitespace-nowrap',
    size === 'phone'
      ? 'min-h-14 px-4 py-2 text-phone'
      : 'min-h-8 px-[14px] py-[5px] text-body max-desk:min-h-11',
    refused
      ? 'cursor-not-allowed border-dotted border-rule bg-transparent text-mute'
      : first
        ? 'border-hand bg-hand-fill text-on-hand'
        : 'border-hand bg-transparent text-hand',
  )
}

/** A key beside the words of the command it runs. */
export function Key({ children }: { children: ReactNode }) {
  return (
    <kbd className="fig inline-block min-w-[18px] border border-current px-1 text-center text-caption font-normal">
      {children}
    </kbd>
  )
}
