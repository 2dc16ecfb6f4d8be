import type { RowDataPacket } from 'mysql2/promise'
import mysql from 'mysql2/promise'

/** Names of the tables that hold anything, apart from the record of migrations. */
export async function filledTables(url: string): Promise<string[]> {
  const connection = await mysql.createConnection({ uri: url })
  try {
    const [tables] = await connection.query<RowDataPacket[]>(
      "SELECT table_name AS name FROM information_schema.tables WHERE table_schema = DATABASE() AND table_name NOT LIKE '\\\\_\\\\_%' ORDER BY name",
    )
    const filled: string[] = []
    for (const { name } of tables) {
      const [rows] = await connection.query<RowDataPacket[]>(`SELECT 1 FROM \`${String(name)}\` LIMIT 1`)
      if (rows.length > 0) filled.push(String(name))
    }
    return filled
  } finally {
    await connection.end()
  }
}
