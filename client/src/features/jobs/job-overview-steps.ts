import type { DesignView, JobView, PacketView } from 'shared'
import type { MarkKind } from '../../components/feedback/verdict-mark'

export interface OverviewStep {
  title: string
  path: string
  mark: MarkKind
  sentence: string
}

interface OverviewFacts {
  job: JobView
  design: DesignView | null
  packet: PacketView | null
}

interface StepRule {
  title: string
  path: string
  isDone: (facts: OverviewFacts) => boolean
  /** What goes against the step, when something does. */
  trouble?: (facts: OverviewFacts) => string | null
  done: (facts: OverviewFacts) => string
  open: string
}

const counted = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`

const failing = ({ design }: OverviewFacts): number =>
  design?.result.checks.filter(({ verdict }) => verdict === 'fail').length ?? 0

const rules: readonly StepRule[] = [
  {
    title: 'Survey',
    path: 'survey',
    isDone: ({ job }) => job.hasSurvey,
    done: () => 'The bank is surveyed.',
    open: 'Enter the level notes or a ground line.',
  },
  {
    title: 'Design',
    path: 'design',
    isDone: ({ job }) => job.chosenDesignId !== null,
    done: ({ design }) => (design ? `“${design.name}” is chosen.` : 'A design is chosen.'),
    open: 'Begin a design.',
  },
  {
    title: 'Figures',
    path: 'figures',
    isDone: ({ design }) => design?.result.quantities.ok === true,
    done: () => 'Every quantity is worked out.',
    open: 'Parts of the design cannot be worked out yet.',
  },
  {
    title: 'Checks',
    path: 'checks',
    isDone: (facts) => facts.design?.result.quantities.ok === true && failing(facts) === 0,
    trouble: (facts) =>
      failing(facts) > 0 ? `${counted(failing(facts), 'check fails', 'checks fail')}.` : null,
    done: () => 'No check fails.',
    open: 'The checks wait for the figures.',
  },
  {
    title: 'Cost and funding',
    path: 'cost-share',
    isDone: ({ design }) => design?.result.funding.ok === true,
    done: () => 'Cost, funds and the landowner’s share are worked out.',
    open: 'The money waits for the quantities and for prices in force.',
  },
  {
    title: 'Packet',
    path: 'packet',
    isDone: ({ packet }) => packet?.status === 'ready',
    trouble: ({ packet }) => (packet?.status === 'failed' ? 'The packet could not be made.' : null),
    done: ({ packet }) => `Revision ${packet?.revision ?? ''} is made.`,
    open: 'Make the packet when the figures stand.',
  },
  {
    title: 'Technical check',
    path: 'packet',
    isDone: ({ packet }) => Boolean(packet?.technicalCheck),
    done: ({ packet }) => `Checked by ${packet?.technicalCheck?.by ?? 'a colleague'}.`,
    open: 'A person who did not design it checks the packet.',
  },
  {
    title: 'Notes',
    path: 'notes',
    isDone: ({ job }) => job.openNotes === 0,
    trouble: ({ job }) =>
      job.openNotes > 0 ? `${counted(job.openNotes, 'note is open', 'notes are open')}.` : null,
    done: () => 'No note is open.',
    open: '',
  },
]

/** How far a job has come on its way to the landowner, one line a step. */
export const jobOverviewSteps = (facts: OverviewFacts): OverviewStep[] =>
  rules.map((rule) => {
    const trouble = rule.trouble?.(facts) ?? null
    const isDone = rule.isDone(facts)
    return {
      title: rule.title,
      path: rule.path,
      mark: trouble !== null ? 'fail' : isDone ? 'pass' : 'waiting',
      sentence: trouble ?? (isDone ? rule.done(facts) : rule.open),
    }
  })
