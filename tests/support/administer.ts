// Statements about whole databases, which need a connection to another one.
import pg from 'pg'

/** The same server, another database. */
export function withDatabase(url: string, name: string): string {
  return Object.assign(new URL(url), { pathname: `/${name}` }).href
}

/** Runs one statement on a connection of its own. */
export async function runStatement(url: string, sql: string): Promise<void> {
  const client = new pg.Client({ connectionString: url })
  await client.connect()
  try {
    await client.query(sql)
  } finally {
    await client.end()
  }
}
