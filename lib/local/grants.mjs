import { query } from './mariadb.mjs'

/*
 * What the application's own account may do with each table. What is signed, sealed or recorded cannot be altered or
 * removed by the application, not even by a fault in it: the database refuses. A table missing here is out of reach.
 */
const EDIT = ['SELECT', 'INSERT', 'UPDATE']
const APPEND = ['SELECT', 'INSERT']
const ALL = ['SELECT', 'INSERT', 'UPDATE', 'DELETE']
const only = (...columns) => columns.map((column) => `UPDATE (${column})`)

/** table → privileges; "UPDATE (column)" is for that column alone. */
export const GRANTS = {
  schema_migrations: ['SELECT'],
  shippers: EDIT,
  users: EDIT,
  places: EDIT,
  species_profiles: APPEND,
  crate_models: EDIT,
  snapshots: APPEND,
  consignments: EDIT,
  consignment_words: ['SELECT', 'INSERT', 'DELETE'],
  animals: ALL,
  crates: ALL,
  occupants: ALL,
  openings: ALL,
  legs: ALL,
  assessments: EDIT,
  assessment_tracks: APPEND,
  findings: APPEND,
  approvals: [...APPEND, ...only('voided_at', 'voided_reason', 'withdrawn')],
  overrides: APPEND,
  conditions: [
    ...APPEND,
    ...only('answer', 'answered_by', 'answered_how', 'answered_at', 'answer_note', 'recorded_by', 'kept'),
  ],
  documents: [...APPEND, ...only('state', 'state_changed_at', 'voided_reason')],
  acknowledgements: APPEND,
  change_requests: APPEND,
  jobs: ALL,
  outbox_messages: [
    ...APPEND,
    ...only(
      'state',
      'attempts',
      'next_attempt_at',
      'lease_until',
      'leased_by',
      'last_error',
      'sent_at',
      'updated_at',
    ),
  ],
  checklist_entries: APPEND,
  audit_events: APPEND,
  throttle_attempts: ['SELECT', 'INSERT', 'DELETE'],
  throttle_keys: ALL,
}

export const MIGRATE_USER = 'steadfold_migrate'
export const APP_USER = 'steadfold_app'
const account = (user) => `'${user}'@'127.0.0.1'`

/** Makes the database and both accounts where absent, with the passwords of this installation. */
export async function createDatabaseAndUsers(server, database, secrets) {
  await query(
    server,
    `CREATE DATABASE IF NOT EXISTS \`${database}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci;
     CREATE USER IF NOT EXISTS ${account(MIGRATE_USER)}, ${account(APP_USER)};
     ALTER USER ${account(MIGRATE_USER)} IDENTIFIED BY '${secrets.databaseMigratePassword}',
                ${account(APP_USER)} IDENTIFIED BY '${secrets.databaseAppPassword}';
     GRANT ALL ON \`${pattern(database)}\`.* TO ${account(MIGRATE_USER)};`,
  )
}

/** Brings the application's rights to exactly GRANTS; run after the migrations. */
export async function applyGrants(server, database) {
  const existing = await currentGrants(server, database)
  const tables = (
    await query(server, `SELECT table_name FROM information_schema.tables WHERE table_schema = '${database}'`)
  ).flat()
  const wanted = new Set(
    tables.flatMap((table) => (GRANTS[table] ?? []).map((privilege) => `${table}\t${privilege}`)),
  )
  const statements = [
    ...[...existing]
      .filter((entry) => !wanted.has(entry))
      .map((entry) => change('REVOKE', 'FROM', database, entry)),
    ...[...wanted]
      .filter((entry) => !existing.has(entry))
      .map((entry) => change('GRANT', 'TO', database, entry)),
  ]
  if (statements.length > 0) await query(server, statements.join('\n'))
}

/** Removes a database together with the rights to its tables, which MariaDB would keep. */
export async function dropDatabase(server, database) {
  const existing = await currentGrants(server, database)
  await query(
    server,
    `${[...existing].map((entry) => change('REVOKE', 'FROM', database, entry)).join('\n')}
     DROP DATABASE IF EXISTS \`${database}\`;
     DELETE FROM mysql.db WHERE Db = '${pattern(database).replaceAll('\\', '\\\\')}';
     FLUSH PRIVILEGES;`,
  )
}

async function currentGrants(server, database) {
  const grantee = account(APP_USER).replaceAll("'", "''")
  const rows = await query(
    server,
    `SELECT table_name, privilege_type, '' FROM information_schema.table_privileges
       WHERE grantee = '${grantee}' AND table_schema = '${database}'
     UNION ALL
     SELECT table_name, privilege_type, column_name FROM information_schema.column_privileges
       WHERE grantee = '${grantee}' AND table_schema = '${database}';`,
  )
  return new Set(
    rows.map(([table, privilege, column]) => `${table}\t${column ? `${privilege} (${column})` : privilege}`),
  )
}

function change(verb, preposition, database, entry) {
  const [table, privilege] = entry.split('\t')
  return `${verb} ${privilege} ON \`${database}\`.\`${table}\` ${preposition} ${account(APP_USER)};`
}

/** An underscore in the database's name is a wildcard in GRANT … ON db.* unless escaped. */
function pattern(database) {
  return database.replaceAll('_', '\\_')
}
