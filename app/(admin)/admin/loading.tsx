import { Waiting } from '@/components/ui/holes'
import { Page } from '@/components/ui/section'

export default function Loading() {
  return (
    <Page>
      <Waiting rows={8}>Reading.</Waiting>
    </Page>
  )
}
