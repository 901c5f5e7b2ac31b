import { redirect } from 'next/navigation'
import { openPage } from '@/app/open-page'

export const dynamic = 'force-dynamic'

/** The first of the admin's pages is the list of people. */
export default async function AdminPage() {
  await openPage('/admin', '/admin')
  redirect('/admin/users')
}
