/**
 * The link says whose it is already: "Leg 6, telephone" needs no second "Leg 6 (flight):", nor "Leg 3, weather row 2, wind"
 * a second "Leg 3 (ramp) weather row 2", nor "Leg 1, start" a second "start:".
 */
export function withoutOwner(message: string, link: string, owner: string): string {
  let rest = message
  for (const part of owner.split(', ')) {
    if (part === '' || !rest.startsWith(part)) break
    rest = rest.slice(part.length).replace(/^(?: \([^)]*\))?[,:]? ?/, '')
  }
  const label = link.slice(owner.length).replace(/^, /, '')
  if (label !== '' && rest.startsWith(`${label}: `)) rest = rest.slice(label.length + 2)
  return rest === '' ? message : rest
}
