import type { ProfileValues } from '@/lib/thermal/scenario'

/** Hair or feathers, of which depth and clipping can be told. */
export function wearsCoat({ bodyPlan }: Pick<ProfileValues, 'bodyPlan'>): boolean {
  return bodyPlan === 'mammal' || bodyPlan === 'bird'
}
