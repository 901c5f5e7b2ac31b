/** Id of the field that holds a path of the form: "legs.2.airTempC" in form "plan" is "plan-legs-2-airTempC". */
export function fieldId(form: string, path: string): string {
  return `${form}-${path.replace(/[^A-Za-z0-9]+/g, '-')}`
}
