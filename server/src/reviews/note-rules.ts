import { Problem, type NoteView, type Role } from 'shared'

export interface Settler {
  personId: string
  roles: readonly Role[]
}

interface NoteToJudge {
  status: NoteView['status']
  authorId: string
}

export function refuseAnswer({ status }: NoteToJudge): void {
  if (status !== 'settled') return
  throw new Problem('transition-not-allowed', { reasons: ['This note is settled. Write a new one.'] })
}

/** Who wrote a note may settle it at any time, a planner once it is answered; nobody else. */
export function refuseSettling({ status, authorId }: NoteToJudge, { personId, roles }: Settler): void {
  if (status === 'settled') {
    throw new Problem('transition-not-allowed', { reasons: ['This note is settled already.'] })
  }
  if (authorId === personId) return
  if (!roles.includes('planner')) {
    throw new Problem('forbidden', {
      reasons: ['Only the person who wrote this note or a planner may settle it.'],
    })
  }
  if (status === 'open') {
    throw new Problem('transition-not-allowed', {
      reasons: ['Answer this note first. Only the person who wrote it may settle it unanswered.'],
    })
  }
}
