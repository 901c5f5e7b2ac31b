/**
 * What an animal shows before it is in danger, in words a driver can check through a crate's door. Offered to the vet, who
 * chooses what the driver is told. Never end-stage signs: those come too late to ring. Common practice, no source.
 */
const DOG = [
  'Panting that does not settle within ten minutes of cooler air',
  'Restless, cannot lie down, drool thick or in strings',
  'Shivers, or lies curled tight and does not look up',
]
const CAT = [
  'Breathes with the mouth open, even once',
  'Drools, or grooms without stopping',
  'Sits hunched with fluffed coat and cold ears',
]
const EARLY_SIGNS: Readonly<Record<string, readonly string[]>> = {
  dog: DOG,
  'snub-nosed-dog': ['Breath grows louder, or snores while awake', ...DOG],
  cat: CAT,
  rabbit: [
    'Breathes fast with flared nostrils, ears red and hot',
    'Wet round nose or chin',
    'Hunched, ears cold and laid back, does not answer a tap',
  ],
  'guinea-pig': [
    'Lies stretched out and breathes fast',
    'Wet round mouth or chin',
    'Hunched apart from the others, coat fluffed',
  ],
  horse: [
    'Patches of sweat on neck or flanks while standing',
    'Nostrils flared, more than 20 breaths a minute at rest',
    'Shivers, or stands tucked up with cold ears',
  ],
  'day-old-chick': [
    'Beaks open, wings held away, chicks spread to the edges',
    'Chicks pile up and peep shrilly',
    'Vents wet or dripping',
  ],
  pigeon: [
    'Beaks open with the throat fluttering',
    'Wings drooped, birds crowd to the mesh',
    'Feathers fluffed, heads drawn in',
  ],
  'bearded-dragon': ['Gapes and climbs the walls', 'Does not lift its head when the box is opened'],
  'ball-python': ['Pushes at the lid or the walls', 'Hangs loose when lifted, slow to curl'],
}

/** Signs offered for a species; none for one nobody has written down. */
export function earlySignsOf(profileKey: string): readonly string[] {
  return EARLY_SIGNS[profileKey] ?? []
}
