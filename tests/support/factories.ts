import * as people from './factories/people'
import * as plan from './factories/plan'
import * as records from './factories/records'

export { AT, sha256 } from './factories/given'

/**
 * One row with everything it stands on. Say only what the test is about: `await make.approval({ decision: 'returned' })`
 * makes its consignment, assessment, snapshot and vet by itself.
 */
export const make = { ...people, ...plan, ...records }
