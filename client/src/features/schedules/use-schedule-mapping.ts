import { useState } from 'react'
import { useWatch } from 'react-hook-form'
import { mapScheduleLinesSchema, type ScheduleView } from 'shared'
import { z } from 'zod'
import { ProblemError } from '../../api/problem-error'
import { useMapSchedule } from '../../api/schedules'
import { useFilledForm } from '../../components/fields/use-filled-form'

/** A select that was emptied may hold nothing where the wire holds null. */
const formSchema = z.strictObject({
  mapping: z.array(
    mapScheduleLinesSchema.shape.mapping.element
      .extend({ quantityKey: z.string().nullish() })
      .transform(({ code, quantityKey }) => ({ code, quantityKey: quantityKey ?? null })),
  ),
})

const mappingOf = ({ lines }: Pick<ScheduleView, 'lines'>) =>
  lines.map(({ code, quantityKey }) => ({ code, quantityKey }))

const newerOf = (error: Error | null): ScheduleView | null =>
  error instanceof ProblemError && error.slug === 'stale-version' ? (error.current as ScheduleView) : null

/** The mapping of a draft. When somebody else saved in between, what was chosen here stays until one decides. */
export function useScheduleMapping(schedule: ScheduleView) {
  const map = useMapSchedule(schedule.id)
  const [seen, setSeen] = useState(schedule)
  const { form, fill } = useFilledForm(formSchema, { mapping: mappingOf(schedule) })
  const typed = useWatch({ control: form.control, name: 'mapping' })
  const chosen = seen.lines.map((line, index) => ({
    ...line,
    quantityKey: typed === undefined ? line.quantityKey : (typed[index]?.quantityKey ?? null),
  }))
  const isChanged = (index: number) => chosen[index]?.quantityKey !== seen.lines[index]?.quantityKey
  const hasChanges = chosen.some((_, index) => isChanged(index))
  const newer = newerOf(map.error)

  const take = (saved: ScheduleView) => {
    setSeen(saved)
    fill({ mapping: mappingOf(saved) })
  }
  const send = async (mapping: z.output<typeof formSchema>['mapping'], version: number) =>
    take(await map.mutateAsync({ mapping, version }))

  return {
    form,
    seen,
    newer,
    chosen,
    hasChanges,
    save: ({ mapping }: z.output<typeof formSchema>) => send(mapping, seen.version),
    error: newer === null ? map.error : null,
    isBusy: map.isPending,
    isSaved: map.isSuccess && !hasChanges,
    /** Only what was chosen here goes over the newer version; the rest stays as it was saved there. */
    keepMine: () => {
      if (newer === null) return
      const mine = mappingOf({ lines: chosen.filter((_, index) => isChanged(index)) })
      void send(mine, newer.version).catch(() => undefined)
    },
    takeTheirs: () => {
      if (newer !== null) take(newer)
      map.reset()
    },
  }
}
