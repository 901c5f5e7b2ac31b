import { join } from './join'

const SIZES = {
  s: 'text-mark-s',
  m: 'text-mark-m',
  phone: 'text-mark-phone',
  l: 'text-mark-l',
} as const

/** A consignment's four figures or a crate's mark, stencilled: what everyone calls it by. Nothing else is set in stencil. */
export function Mark({
  children,
  size = 'm',
  label,
}: {
  children: string
  size?: keyof typeof SIZES
  label?: string
}) {
  return (
    <span className={join('crate text-ink', SIZES[size])}>
      {label && <span className="sr-only">{label} </span>}
      {children}
    </span>
  )
}
