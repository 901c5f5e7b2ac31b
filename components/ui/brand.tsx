/** The slat mark: three slats, the middle one vented. Always with words beside it. */
export function SlatMark({ width = 26 }: { width?: number }) {
  return (
    <svg
      width={width}
      height={(width * 24) / 26}
      viewBox="0 0 26 24"
      aria-hidden="true"
      className="block shrink-0 fill-ink"
    >
      <rect width="26" height="6" />
      <path
        fillRule="evenodd"
        d="M0 9h26v6H0zM5.5 10.2a1.8 1.8 0 100 3.6 1.8 1.8 0 000-3.6zM13 10.2a1.8 1.8 0 100 3.6 1.8 1.8 0 000-3.6zM20.5 10.2a1.8 1.8 0 100 3.6 1.8 1.8 0 000-3.6z"
      />
      <rect y="18" width="26" height="6" />
    </svg>
  )
}

/** Mark and name, as they stand at the left of every head. */
export function Brand({ href = '/' }: { href?: string }) {
  return (
    <a href={href} className="flex items-center gap-2 text-ink no-underline">
      <SlatMark />
      <span className="crate text-section">STEADFOLD</span>
    </a>
  )
}
