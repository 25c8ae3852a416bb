import Button from '@mui/material/Button'
import { useState } from 'react'
import type { ScheduleView } from 'shared'
import { LeaveGuard } from '../../components/feedback/leave-guard'
import { StaleChoice } from '../../components/feedback/stale-choice'
import { StatusLine } from '../../components/feedback/status-line'
import { Form } from '../../components/fields/form'
import { SubmitButton } from '../../components/fields/submit-button'
import { RuledTable, type Column } from '../../components/layout/ruled-table'
import { Section } from '../../components/layout/section'
import { mappingDifferences } from './mapping-differences'
import { MappingRow } from './mapping-row'
import { PutScheduleInForce } from './put-schedule-in-force'
import { unmappedLines } from './unmapped-lines'
import { useScheduleMapping } from './use-schedule-mapping'

const columns: readonly Column[] = [
  { key: 'code', title: 'Code' },
  { key: 'title', title: 'Line' },
  { key: 'rate', title: 'Rate', isFigure: true },
  { key: 'quantity', title: 'Pays for', width: '45%' },
]

/** A long schedule is shown in parts: every row holds a list to choose from. */
const SHOWN_AT_ONCE = 100

interface MappingFormProps {
  schedule: ScheduleView
}

/** Which of our quantities each line pays for. Lines that pay for nothing yet stand first. */
export function MappingForm({ schedule }: MappingFormProps) {
  const mapping = useScheduleMapping(schedule)
  const { form, seen, newer, chosen, hasChanges } = mapping
  const [shown, setShown] = useState(SHOWN_AT_ONCE)
  const open = unmappedLines(chosen)
  const rows = chosen.map((line, index) => ({ line, index, isOpen: seen.lines[index]?.quantityKey === null }))
  // By what is stored, so that no row jumps away while one chooses in it.
  rows.sort((one, other) => Number(other.isOpen) - Number(one.isOpen))
  return (
    <Section
      title="What each line pays for"
      aside={
        open.length === 0 ? 'Every line is mapped.' : `${open.length} of ${chosen.length} pay for nothing yet`
      }
    >
      <LeaveGuard hasUnsaved={hasChanges} />
      {newer && (
        <StaleChoice
          sentence="The mapping of this schedule was changed."
          differences={mappingDifferences(chosen, newer.lines)}
          onKeepMine={mapping.keepMine}
          onTakeTheirs={mapping.takeTheirs}
          isBusy={mapping.isBusy}
        />
      )}
      <Form form={form} problem={mapping.error} label="Mapping" onSubmit={mapping.save}>
        <RuledTable caption="Lines of the schedule, not mapped first" columns={columns} minWidth={720}>
          {rows.slice(0, shown).map(({ line, index }) => (
            <MappingRow key={line.code} line={line} index={index} />
          ))}
        </RuledTable>
        {rows.length > shown && (
          <Button variant="text" onClick={() => setShown(shown + SHOWN_AT_ONCE)}>
            Show more lines ({rows.length - shown} left)
          </Button>
        )}
        <div style={{ marginTop: 16 }}>
          <SubmitButton words="Save the mapping" busyWords="Saving…" isQuiet />
        </div>
        <StatusLine words={mapping.isSaved ? 'The mapping is saved.' : null} />
      </Form>
      <PutScheduleInForce
        schedule={seen}
        unmapped={open}
        reasons={hasChanges ? ['Save the mapping first.'] : []}
      />
    </Section>
  )
}
