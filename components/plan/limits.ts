/** How many of a thing the form lets one add; the schema says the same and refuses more. */
export const MAX_WEATHER_ROWS = 60
export const MAX_OPENINGS = 40
export const MAX_ANIMALS = 60
export const MAX_CRATES = 26
export const MAX_LEGS = 40
