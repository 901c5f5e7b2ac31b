import { Waiting } from '@/components/ui/holes'
import { Page } from '@/components/ui/section'

export default function Loading() {
  return (
    <Page className="mx-auto max-w-[430px]">
      <Waiting rows={8}>Reading the checklist.</Waiting>
    </Page>
  )
}
