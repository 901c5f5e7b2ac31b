/** What everyone calls a crate by, stencilled large: "2417-A". */
export function crateMark(mark: string, letter: string): string {
  return `${mark}-${letter}`
}
