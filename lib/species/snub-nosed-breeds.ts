/**
 * Breeds and crosses with shortened airways, dogs and cats, as breed notes name them. Lower case; `snubNosedBreed` reads a note.
 */
export const snubNosedBreeds: readonly string[] = [
  'affenpinscher',
  'american bulldog',
  'american bully',
  'australian bulldog',
  'boston terrier',
  'boxer',
  'brussels griffon',
  'griffon bruxellois',
  'petit brabancon',
  'bulldog',
  'english bulldog',
  'french bulldog',
  'frenchie',
  'old english bulldog',
  'olde english bulldogge',
  'bullmastiff',
  'cane corso',
  'cavalier king charles spaniel',
  'king charles spaniel',
  'chow chow',
  'dogue de bordeaux',
  'english toy spaniel',
  'japanese chin',
  'japanese spaniel',
  'lhasa apso',
  'mastiff',
  'neapolitan mastiff',
  'pekingese',
  'pekinese',
  'presa canario',
  'pug',
  'shar pei',
  'shar-pei',
  'shih tzu',
  'shih-tzu',
  'tibetan spaniel',
  'bugg',
  'cavapug',
  'chug',
  'frug',
  'jug',
  'pugalier',
  'puggle',
  'pugapoo',
  'shihpoo',
  'shih-poo',
  'shorkie',
  'british shorthair',
  'burmese',
  'exotic shorthair',
  'himalayan',
  'persian',
  'scottish fold',
]

/** The snub-nosed breed or cross a breed note names, as whole words (the longest that fits), or null. */
export function snubNosedBreed(breedNote: string): string | null {
  const words = ` ${wordsOf(breedNote)} `
  const named = snubNosedBreeds.filter((breed) => words.includes(` ${wordsOf(breed)} `))
  return named.reduce<string | null>(
    (longest, breed) => (longest && longest.length >= breed.length ? longest : breed),
    null,
  )
}

function wordsOf(text: string): string {
  return text
    .toLowerCase()
    .replace(/[^a-z]+/g, ' ')
    .trim()
}
