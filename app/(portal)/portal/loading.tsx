import { Waiting } from '@/components/ui/holes'
import { Page, PageTitle } from '@/components/ui/section'

export default function Loading() {
  return (
    <Page className="mx-auto max-w-[1232px]">
      <PageTitle>Your consignments</PageTitle>
      <Waiting rows={6}>Reading your consignments.</Waiting>
    </Page>
  )
}
