import type { Act, ActRequest } from 'shared'

/** What the guards may look at of an act. */
export const actRequest = (act: Act): ActRequest => ({
  ...act,
  notes: 'notes' in act ? act.notes.length : undefined,
})
