import { Waiting } from '@/components/ui/holes'
import { Page, PageTitle } from '@/components/ui/section'

export default function Loading() {
  return (
    <Page>
      <PageTitle>Crate set-up review</PageTitle>
      <Waiting rows={6}>Reading the queue.</Waiting>
    </Page>
  )
}
