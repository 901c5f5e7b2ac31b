import { SubPages } from '@/components/ui/tabs'

const PAGES = [
  { href: '/admin/users', words: 'Users' },
  { href: '/admin/mail', words: 'Mail queue' },
  { href: '/admin/audit', words: 'Audit trail' },
  { href: '/admin/certificate', words: 'Certificate' },
  { href: '/species', words: 'Species and limits' },
] as const

/** An admin's pages, as words over a rule. */
export function AdminPages({ current }: { current: (typeof PAGES)[number]['href'] }) {
  return <SubPages items={PAGES} current={current} label="Administration" />
}
