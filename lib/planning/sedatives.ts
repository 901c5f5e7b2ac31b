/*
 * Drugs that sedate, tranquillise or put to sleep, by their international non-proprietary names, and the words people
 * write instead. From general veterinary pharmacology, from memory: a list to catch what was forgotten, never to allow.
 */
const SEDATIVES: readonly string[] = [
  'acepromazine',
  'alfaxalone',
  'alprazolam',
  'azaperone',
  'brotizolam',
  'butorphanol',
  'chlorpromazine',
  'clonidine',
  'detomidine',
  'dexmedetomidine',
  'diazepam',
  'diphenhydramine',
  'fentanyl',
  'gabapentin',
  'haloperidol',
  'hydroxyzine',
  'imepitoin',
  'ketamine',
  'lorazepam',
  'medetomidine',
  'methadone',
  'midazolam',
  'morphine',
  'oxazepam',
  'phenobarbital',
  'phenobarbitone',
  'pregabalin',
  'promethazine',
  'propofol',
  'romifidine',
  'tasipimidine',
  'temazepam',
  'tiletamine',
  'tramadol',
  'trazodone',
  'xylazine',
  'zolazepam',
  'zuclopenthixol',
  'sedated',
  'sedation',
  'sedative',
  'sedatives',
  'tranquilliser',
  'tranquillisers',
  'tranquillizer',
  'tranquilizer',
  'tranquillised',
]

const DENIED: readonly string[] = ['no', 'not', 'without', 'never']

/** The first sedative a note on medicines names, or null; "no sedatives" and "not sedated" name none. */
export function sedativeIn(medicines: string): string | null {
  const words = medicines.toLowerCase().split(/[^a-z]+/)
  const at = words.findIndex(
    (word, index) => SEDATIVES.includes(word) && !DENIED.includes(words[index - 1] ?? ''),
  )
  return words[at] ?? null
}

/** What was given, or null where the note says that nothing was: empty, "none", "no medicines". */
export function givenMedicines(medicines: string): string | null {
  const plain = medicines.trim()
  return /^(|-|–|none|nil|no|no medicines?|nothing|n\/a)[.]?$/i.test(plain) ? null : plain
}
