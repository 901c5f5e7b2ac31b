/*
 * How the renderer laid a document out. Sheets are planned with the heights of their blocks before they are drawn; here is
 * seen whether they came out as high.
 */

interface Laid {
  box: { top: number; height: number }
}

/** True where what is printed on a sheet runs into its foot. `said` is what the renderer gives the document's onRender. */
export function runsOver(said: object): boolean {
  return sheetsOf(said).some(({ children }) => {
    // The foot is drawn last on a sheet, what is printed before it.
    const [printed, foot] = children.slice(-2)
    if (printed === undefined || foot === undefined) throw new Error('A sheet was laid out without its foot.')
    return printed.box.top + printed.box.height > foot.box.top
  })
}

/** The renderer's types do not tell of them. */
function sheetsOf(said: object): { children: Laid[] }[] {
  const { _INTERNAL__LAYOUT__DATA_: layout } = said as {
    _INTERNAL__LAYOUT__DATA_?: { children: { children: Laid[] }[] }
  }
  if (layout === undefined) throw new Error('The renderer no longer tells how it laid a document out.')
  return layout.children
}
