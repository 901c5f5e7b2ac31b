import { Waiting } from '@/components/ui/holes'
import { Page, PageTitle } from '@/components/ui/section'

export default function Loading() {
  return (
    <Page className="mx-auto max-w-[430px]">
      <PageTitle>Your runs</PageTitle>
      <Waiting rows={4}>Reading your runs.</Waiting>
    </Page>
  )
}
