import { execFile } from 'node:child_process'
import { mkdtemp, rm, writeFile } from 'node:fs/promises'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { promisify } from 'node:util'

/** Poppler's and NSS's own tools: a reader that is not ours judges what we made. */
const run = promisify(execFile)

export async function inFolder<T>(work: (folder: string) => Promise<T>): Promise<T> {
  const folder = await mkdtemp(path.join(tmpdir(), 'steadfold-pdf-'))
  try {
    return await work(folder)
  } finally {
    await rm(folder, { recursive: true, force: true })
  }
}

/** The text of a PDF as `pdftotext -layout` reads it. */
export function textOf(pdf: Uint8Array): Promise<string> {
  return inFolder(async (folder) => {
    const file = path.join(folder, 'a.pdf')
    await writeFile(file, pdf)
    const { stdout } = await run('pdftotext', ['-layout', file, '-'])
    return stdout
  })
}

/** What pdfsig says, with a root trusted for this question alone. */
export function pdfsig(pdf: Uint8Array, rootPem: string | null): Promise<string> {
  return inFolder(async (folder) => {
    const file = path.join(folder, 'a.pdf')
    const database = `sql:${folder}`
    await writeFile(file, pdf)
    await run('certutil', ['-N', '-d', database, '--empty-password'])
    if (rootPem !== null) {
      const root = path.join(folder, 'root.pem')
      await writeFile(root, rootPem)
      await run('certutil', ['-A', '-d', database, '-n', 'root', '-t', 'CT,C,C', '-i', root])
    }
    const { stdout } = await run('pdfsig', ['-nssdir', database, file]).catch(
      (error: { stdout?: string }) => ({ stdout: error.stdout ?? '' }),
    )
    return stdout
  })
}

export async function pdfInfo(pdf: Uint8Array): Promise<Record<string, string>> {
  return inFolder(async (folder) => {
    const file = path.join(folder, 'a.pdf')
    await writeFile(file, pdf)
    const { stdout } = await run('pdfinfo', [file])
    return Object.fromEntries(
      stdout.split('\n').flatMap((line) => {
        const [, name, value] = /^([^:]+):\s*(.*)$/.exec(line) ?? []
        return name === undefined || value === undefined ? [] : [[name, value]]
      }),
    )
  })
}

/** Names of fonts that are used and not embedded. */
export async function fontsNotEmbedded(pdf: Uint8Array): Promise<string[]> {
  return inFolder(async (folder) => {
    const file = path.join(folder, 'a.pdf')
    await writeFile(file, pdf)
    const { stdout } = await run('pdffonts', [file])
    return stdout
      .split('\n')
      .slice(2)
      .filter((line) => / no  (no|yes) (no|yes) /.test(line))
      .map((line) => line.split(' ')[0] ?? '')
  })
}
