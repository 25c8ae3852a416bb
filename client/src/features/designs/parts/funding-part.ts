import { rateChoices } from '../choice-words'
import { money, select } from '../field-specs'
import type { PartSpec } from '../part-spec'

export const fundingPart: PartSpec = {
  part: 'funding',
  title: 'Funding',
  sentence:
    'Which funds pay, in the order in which they are asked. All together never pay more than the cost.',
  items: [
    {
      kind: 'list',
      name: 'sources',
      title: 'Funds, in order',
      one: 'fund',
      empty: { rate: 'base' },
      isOrdered: true,
      items: [
        { kind: 'schedule', name: 'scheduleKey' },
        select('rate', 'Rate', rateChoices),
        money('personLimitRemaining', 'Left under the person’s limit', {
          isOptional: true,
          hint: 'Left empty: no limit',
        }),
        { kind: 'contracted', name: 'contracted' },
      ],
    },
  ],
  start: () => ({ sources: [] }),
  results: ['quantities', 'cost', 'funding'],
}
