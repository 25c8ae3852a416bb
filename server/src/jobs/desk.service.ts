import { Injectable } from '@nestjs/common'
import type { Actor, DeskItem, Role } from 'shared'
import type { Tx } from '../platform/database/tx.js'
import { deskQuery } from './desk-query.js'
import { deskRules } from './desk-rules.js'
import type { DeskRow } from './desk-row.js'
import type { Asking } from './job-access.service.js'

/** What waits for a person, oldest first. A person with two roles has both desks in one. */
@Injectable()
export class DeskService {
  async list(tx: Tx, { actor, onlyJobId }: Asking): Promise<DeskItem[]> {
    const staff = actor.roles.filter((role) => role !== 'landowner')
    const waiting = [
      ...(await this.waitingFor(tx, actor, staff, false)),
      ...(await this.waitingFor(tx, actor, actor.roles.includes('landowner') ? ['landowner'] : [], true)),
    ]
    return waiting
      .filter(({ jobId }) => onlyJobId === null || jobId === onlyJobId)
      .sort(
        (one, other) =>
          one.waitingSince.localeCompare(other.waitingSince) || one.number.localeCompare(other.number),
      )
  }

  private async waitingFor(
    tx: Tx,
    actor: Actor,
    roles: readonly Role[],
    ownOnly: boolean,
  ): Promise<DeskItem[]> {
    const rules = deskRules.filter((rule) => rule.roles.some((role) => roles.includes(role)))
    if (rules.length === 0) return []
    const states = [...new Set(rules.flatMap((rule) => rule.states))]
    const rows: DeskRow[] = await tx.manager.query(deskQuery, [
      tx.districtId,
      actor.personId,
      states,
      ownOnly,
    ])
    return rows.flatMap((row) => {
      const rule = rules.find(({ states: at, holds }) => at.includes(row.state) && holds(row))
      return rule ? [deskItem(row, rule)] : []
    })
  }
}

function deskItem(row: DeskRow, rule: (typeof deskRules)[number]): DeskItem {
  return {
    jobId: row.id,
    number: row.number,
    title: row.title,
    state: row.state,
    sentence: rule.sentence(row),
    nextAct: rule.nextAct,
    path: rule.path(row.id),
    waitingSince: rule.since(row).toISOString(),
  }
}
