import type { DataSource, EntityManager } from 'typeorm'

/** Does work as the owner of the tables, who too sees one district alone. */
export function asOwnerIn<T>(
  owner: DataSource,
  districtId: string,
  work: (manager: EntityManager) => Promise<T>,
): Promise<T> {
  return owner.transaction(async (manager) => {
    await manager.query(`select set_config('wadestone.district', $1, true)`, [districtId])
    return work(manager)
  })
}

/** Tables whose rows belong to one district. */
export const districtTables = (owner: DataSource): string[] =>
  owner.entityMetadatas
    .filter(({ columns }) => columns.some(({ databaseName }) => databaseName === 'district_id'))
    .map(({ tableName }) => tableName)
    .sort()

/** Every row a district has, table by table: how many, and a hash that moves with any write, even one of equal values. */
export function rowsOf(owner: DataSource, districtId: string): Promise<Record<string, string>> {
  return asOwnerIn(owner, districtId, async (manager) => {
    const rows: Record<string, string> = {}
    for (const table of [...districtTables(owner), 'districts', 'people']) {
      const [{ count, hash }] = await manager.query(
        `select count(*)::int as count, md5(coalesce(string_agg(md5(t.xmin || t::text), '' order by t::text), '')) as hash
         from ${table} t`,
      )
      rows[table] = `${count} ${hash}`
    }
    return rows
  })
}
