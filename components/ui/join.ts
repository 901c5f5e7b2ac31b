/** Class names in one string; what is false or empty falls out. */
export function join(...classes: (string | false | null | undefined)[]): string {
  return classes.filter(Boolean).join(' ')
}
