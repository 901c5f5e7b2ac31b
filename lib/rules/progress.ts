/** Where a long assessment stands; done and total count short runs. */
export interface Progress {
  /** "Margins, leg 4 of 9". */
  stage: string
  done: number
  total: number
}

/** What a stage goes through one by one. */
export type StagePart = 'leg' | 'schedule'

/** "Margins, leg 4 of 9", the fourth being in hand. */
export function stageWords(stage: string, part: StagePart, number: number, of: number): string {
  return `${stage}, ${part} ${number} of ${of}`
}

/** How many parts a stage has behind it and in all; null where it goes through none. */
export function partsOfStage(words: string): { done: number; of: number } | null {
  const match = /, (?:leg|schedule) (\d+) of (\d+)$/.exec(words)
  return match === null ? null : { done: Number(match[1]) - 1, of: Number(match[2]) }
}
