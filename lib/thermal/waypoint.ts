import type { Held } from './closure'
import { freshMemory, type Memory } from './extremes'
import type { LegExtremes, StartFrom, StepCounts } from './run'
import type { Store } from './store'
import { freshTracks, type Tracks } from './tracks'

/*
 * Journeys that differ only from some leg on share the way up to it: a run leaves a waypoint behind each leg, and another
 * goes on from there. Nothing of the solver outlives a leg, so it comes to the same bytes as a run from the departure.
 */

/** What a run carries from one leg into the next. */
export interface Carried {
  store: Store
  memories: Map<string, Memory>
  tracks: Tracks
  extremes: LegExtremes[]
  snapshots: StartFrom[]
  held: Held
  counts: StepCounts
  reachedS: number
}

export interface Waypoint extends Carried {
  /** Index of the leg that comes next. */
  nextLeg: number
  tracked: boolean
}

/** What is carried now, as a waypoint before leg `nextLeg`. Tracks are copied only where the run keeps them. */
export function waypointOf(run: Carried, nextLeg: number, tracked: boolean, scheduleId: string): Waypoint {
  return { nextLeg, tracked, ...copyOf(run, tracked, scheduleId) }
}

/** What a run that goes on from a waypoint carries; its tracks are named after its own schedule. */
export function carriedFrom(waypoint: Waypoint, tracked: boolean, scheduleId: string): Carried {
  if (tracked && !waypoint.tracked) throw new Error('This waypoint holds no tracks to go on with.')
  return copyOf(waypoint, tracked, scheduleId)
}

/** Maps and lists are the run's own; what lies in them is written once, but for the memories. */
function copyOf(from: Carried, tracked: boolean, scheduleId: string): Carried {
  const { store, held } = from
  return {
    store: {
      crates: new Map(store.crates),
      animals: new Map(store.animals),
      spaces: new Map(store.spaces),
    },
    memories: new Map(Array.from(from.memories, ([id, memory]) => [id, copyOfMemory(memory)])),
    tracks: tracked ? copyOfTracks(from.tracks, scheduleId) : freshTracks(from.tracks.nextS),
    extremes: [...from.extremes],
    snapshots: [...from.snapshots],
    held: { ...held, animals: new Map(held.animals), crates: new Map(held.crates) },
    counts: { ...from.counts },
    reachedS: from.reachedS,
  }
}

function copyOfMemory({ past, runsMin }: Memory): Memory {
  return { ...freshMemory(), past: { ...past }, runsMin: { ...runsMin } }
}

function copyOfTracks({ crates, animals, spaces, nextS }: Tracks, scheduleId: string): Tracks {
  return {
    crates: new Map(Array.from(crates, ([id, track]) => [id, { ...copyOfLists(track), scheduleId }])),
    animals: new Map(
      Array.from(animals, ([id, track]) => [
        id,
        {
          ...copyOfLists(track),
          heat: copyOfLists(track.heat),
          effort: copyOfLists(track.effort),
          scheduleId,
        },
      ]),
    ),
    spaces: spaces.map((track) => ({ ...copyOfLists(track), scheduleId })),
    nextS,
  }
}

function copyOfLists<T extends object>(of: T): T {
  return Object.fromEntries(
    Object.entries(of).map(([key, value]: [string, unknown]) => [
      key,
      Array.isArray(value) ? value.slice() : value,
    ]),
  ) as T
}
