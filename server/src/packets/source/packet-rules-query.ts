import type { SettingValue } from 'shared'
import type { PacketSchedule, PacketSource } from '../document/packet-source.js'

export interface PacketRulesRow {
  criteriaSet: PacketSource['criteriaSet']
  costList: PacketSource['costList']
  schedules: PacketSchedule[]
  settings: SettingValue[]
}

const date = (column: string): string => `to_char(${column}, 'YYYY-MM-DD')`

/** By which rules and prices a revision was worked out: $1 district, $2 revision. */
export const packetRulesQuery = `
  select
    (
      select jsonb_build_object('name', c.name, 'effectiveFrom', ${date('c.effective_from')})
      from criteria_sets c where c.district_id = r.district_id and c.id = r.criteria_set_id
    ) as "criteriaSet",
    (
      select jsonb_build_object('name', l.name, 'effectiveFrom', ${date('l.effective_from')}, 'source', l.source)
      from cost_lists l where l.district_id = r.district_id and l.id = r.cost_list_id
    ) as "costList",
    coalesce((
      select jsonb_agg(
        jsonb_build_object(
          'key', s.key,
          'name', s.name,
          'fiscalYear', s.fiscal_year,
          'effectiveFrom', ${date('s.effective_from')},
          'effectiveTo', ${date('s.effective_to')}
        ) order by array_position(r.schedule_ids, s.id)
      )
      from payment_schedules s where s.district_id = r.district_id and s.id = any (r.schedule_ids)
    ), '[]') as schedules,
    r.settings
  from revisions r
  where r.district_id = $1 and r.id = $2
`
