import { closeDatabase } from '@/lib/db/connection'
import { releaseConsignment } from '@/lib/domain/release/release'
import { models } from '@/models'
import { lauderKelso } from '@/seeders/demo/consignments/lauder-kelso'
import { requestIdOf } from '@/seeders/demo/request-id'
import { bringTo, confirmAll, personOf, workOff } from '@/seeders/demo/stages'
import { demoWorld } from '@/seeders/demo/world'
import { benchAssess, benchSimulate, benchSolvers } from './bench-thermal'

const RELEASES = 4
const HOUR_MS = 3_600_000

const print = (line: string) => console.log(`  ${line}`)
console.log('One run of the reference consignment: 48 h, 8 legs, 4 crates, 6 animals')
benchSimulate(print)
console.log(
  '\nOur solver and an independent one (odex), at the same largest error of body temperature over all minutes',
)
benchSolvers(print)
console.log('\nA whole assessment of the reference consignment')
benchAssess(print)
console.log('\nRelease: render, sign, store, queue the mail')
await benchRelease()
await closeDatabase()

/** Releases the same short journey several times over; the first is cold and printed apart. */
async function benchRelease() {
  const world = await demoWorld(new Date())
  const desk = await personOf(world, 'dispatcher')
  const at = new Date(world.now.getTime() - lauderKelso.preparedHoursAgo * HOUR_MS)
  for (let turn = 1; turn <= RELEASES; turn += 1) {
    const key = `bench-${turn}-${process.pid}`
    await bringTo({ ...lauderKelso, key, stage: 'approved' }, world)
    const row = await models.Consignment.findOne({ order: [['id', 'DESC']], rejectOnEmpty: true })
    await confirmAll(desk, row.id, key, at)
    await releaseConsignment(desk, { consignmentId: row.id, requestId: requestIdOf(key, 'release') }, at)
    const began = performance.now()
    await workOff(at)
    const milliseconds = performance.now() - began
    const pages = await models.Document.sum('pageCount', { where: { consignmentId: row.id } })
    const aim = 500 + 150 * pages
    print(
      `${turn === 1 ? 'cold' : 'warm'}: ${milliseconds.toFixed(0)} ms for ${pages} pages (aim when warm: ${aim} ms)`,
    )
  }
}
