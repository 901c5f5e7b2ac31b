import { notFound } from 'next/navigation'

/** The number of a row out of an address; what is no number is no page. */
export function rowId(text: string): number {
  if (!/^[1-9]\d{0,14}$/.test(text)) notFound()
  return Number(text)
}
