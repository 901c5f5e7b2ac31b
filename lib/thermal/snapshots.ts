import { SteadfoldError } from '../errors'
import type { Run, StartFrom } from './run'

/** The stored state at or last before a minute: ask `simulate` for `snapshotEveryMin` to have states inside legs. */
export function stateAt(run: Run, minute: number): StartFrom {
  let found: StartFrom | undefined
  for (const snapshot of run.snapshots) {
    if (snapshot.minute > minute + 1e-6) break
    found = snapshot
  }
  if (!found) throw new SteadfoldError('invalid', `This run holds no state at minute ${minute}.`)
  return found
}
