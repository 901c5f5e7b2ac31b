import { Stamp } from '@/components/ui/stamp'
import { Tabs } from '@/components/ui/tabs'
import { kilograms } from '@/lib/views/format'
import type { SheetView } from '@/lib/views/sheet'

/** The animals side by side with their verdicts; each has an address of its own. */
export function AnimalTabs({ view, animalId, base }: { view: SheetView; animalId: string; base: string }) {
  const href = (id: string) => `${base}?animal=${encodeURIComponent(id)}`
  return (
    <Tabs
      label="Animals"
      current={href(animalId)}
      items={view.animals.map((animal) => ({
        href: href(animal.animalId),
        letter: animal.crateLetter,
        name: animal.massKg === null ? animal.name : `${animal.name}, ${kilograms(animal.massKg)}`,
        words: animal.describes,
        stamp: <Stamp {...animal.stamp} />,
      }))}
    />
  )
}
