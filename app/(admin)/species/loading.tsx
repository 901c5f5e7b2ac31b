import { Waiting } from '@/components/ui/holes'
import { Page, PageTitle } from '@/components/ui/section'

export default function Loading() {
  return (
    <Page>
      <PageTitle>Species and limits</PageTitle>
      <Waiting rows={8}>Reading the species rows.</Waiting>
    </Page>
  )
}
