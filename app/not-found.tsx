import { Top } from '@/components/ui/top'
import NothingHere from './nothing-here'

export default function NotFound() {
  return (
    <>
      <Top />
      <NothingHere />
    </>
  )
}
