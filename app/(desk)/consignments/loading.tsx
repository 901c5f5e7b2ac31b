import { Waiting } from '@/components/ui/holes'
import { Page, PageTitle } from '@/components/ui/section'

export default function Loading() {
  return (
    <Page>
      <PageTitle>Consignments</PageTitle>
      <Waiting rows={8}>Reading the board.</Waiting>
    </Page>
  )
}
