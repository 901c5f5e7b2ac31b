import { createHash } from 'node:crypto'
import { tmpdir } from 'node:os'
import path from 'node:path'
import { fileURLToPath } from 'node:url'

/** The project's root folder, wherever a script is started from. */
export const root = path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..')

/** Everything one machine keeps: the database, secrets, mails. Tests keep theirs apart, so that neither disturbs the other. */
export const dataDir = path.resolve(root, process.env.DATA_DIR || '.data')
export const testDataDir = path.join(root, '.data', 'test')

/**
 * Where the database's files are under a data folder. A socket path may hold 107 characters and a project may lie
 * deeper than that, so the socket lies in the system's temporary folder, under a hash of the project's path.
 */
export function databaseFiles(folder) {
  const hash = createHash('sha256').update(folder).digest('hex').slice(0, 12)
  const temporary = tmpdir().length < 80 ? tmpdir() : '/tmp'
  return {
    folder: path.join(folder, 'mariadb'),
    socket: path.join(temporary, `steadfold-${hash}.sock`),
    pid: path.join(folder, 'mariadb.pid'),
    log: path.join(folder, 'mariadb.log'),
    port: path.join(folder, 'mariadb.port'),
  }
}
