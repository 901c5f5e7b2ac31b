import type { Metadata } from 'next'
import Link from 'next/link'
import { openPage, orNotFound } from '@/app/open-page'
import { SpeciesSheet } from '@/components/admin/species-sheet'
import { Page, PageTitle } from '@/components/ui/section'
import { loadSpecies } from '@/lib/domain/catalogue/species'

export const metadata: Metadata = { title: 'Species row' }
export const dynamic = 'force-dynamic'

export default async function SpeciesRowPage({ params }: { params: Promise<{ key: string }> }) {
  const { key } = await params
  const actor = await openPage('/species/[key]', `/species/${encodeURIComponent(key)}`)
  const view = await orNotFound(loadSpecies(actor, { key }))
  return (
    <Page>
      <PageTitle acts={<Link href="/species">All species</Link>}>{view.commonName}</PageTitle>
      <SpeciesSheet view={view} />
    </Page>
  )
}
