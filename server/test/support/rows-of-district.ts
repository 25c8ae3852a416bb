import type { DataSource, EntityManager } from 'typeorm'

/** Does work as the owner of the tables, whom row security may or may not bind: a test names the district itself too. */
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

const ofDistrict = (table: string): [table: string, where: string] => [table, 't.district_id = $1']

const inOneDistrict: [table: string, where: string][] = [
  ['districts', 't.id = $1'],
  ['people', 't.id in (select person_id from memberships where district_id = $1)'],
]

/** Every row a district has, table by table: how many, and a hash that moves with any write, even one of equal values. */
export function rowsOf(owner: DataSource, districtId: string): Promise<Record<string, string>> {
  return asOwnerIn(owner, districtId, async (manager) => {
    const rows: Record<string, string> = {}
    for (const [table, where] of [...districtTables(owner).map(ofDistrict), ...inOneDistrict]) {
      const [{ count, hash }] = await manager.query(
        `select count(*)::int as count,
           md5(coalesce(string_agg(md5(t.xmin || t::text), '' order by t::text), '')) as hash
         from ${table} t where ${where}`,
        [districtId],
      )
      rows[table] = `${count} ${hash}`
    }
    return rows
  })
}
