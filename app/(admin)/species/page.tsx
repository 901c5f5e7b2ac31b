import type { Metadata } from 'next'
import { openPage } from '@/app/open-page'
import { AdminPages } from '@/components/admin/admin-pages'
import { SpeciesTable } from '@/components/admin/species-table'
import { Empty } from '@/components/ui/notice'
import { Page, PageTitle } from '@/components/ui/section'
import { listSpecies } from '@/lib/domain/catalogue/species'

export const metadata: Metadata = { title: 'Species and limits' }
export const dynamic = 'force-dynamic'

export default async function SpeciesPage() {
  const actor = await openPage('/species', '/species')
  const rows = await listSpecies(actor)
  const usable = rows.filter((row) => row.refused === '').length
  return (
    <Page>
      <PageTitle words={`${rows.length} species rows, ${usable} can be assessed`}>
        Species and limits
      </PageTitle>
      {actor.role === 'admin' && <AdminPages current="/species" />}
      {rows.length === 0 ? (
        <Empty>No species row is kept: nothing can be assessed.</Empty>
      ) : (
        <SpeciesTable rows={rows} />
      )}
    </Page>
  )
}
