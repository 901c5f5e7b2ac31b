import type { DemoConsignment } from './common'
import { collieHome } from './collie-home'
import { glasgowMuscat } from './glasgow-muscat'
import { glasgowValletta } from './glasgow-valletta'
import { lauderKelso } from './lauder-kelso'
import { peeblesUtrecht } from './peebles-utrecht'
import { rexHome } from './rex-home'
import { princetonSedona } from './princeton-sedona'
import { balfronPeebles, obanCarlisle, peeblesBalfron } from './short-runs'

export const DEMO_CONSIGNMENTS: readonly DemoConsignment[] = [
  lauderKelso,
  peeblesUtrecht,
  glasgowMuscat,
  glasgowValletta,
  princetonSedona,
  balfronPeebles,
  peeblesBalfron,
  obanCarlisle,
  collieHome,
  rexHome,
]
