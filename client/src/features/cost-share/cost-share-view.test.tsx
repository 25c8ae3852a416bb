import { render, screen } from '@testing-library/react'
import { MemoryRouter } from 'react-router-dom'
import type { CostEstimate, DesignView, FundedSource, FundingResult, Money } from 'shared'
import { describe, expect, it } from 'vitest'
import { CostShareView } from './cost-share-view'

const money = (text: string) => text as Money

const cost: CostEstimate = {
  lines: [
    {
      key: 'gate',
      practice: '382',
      description: 'Gate',
      quantity: 2,
      unit: 'each',
      unitCost: { low: '200.00', typical: '245.00', high: '300.00' },
      low: money('400.00'),
      typical: money('490.00'),
      high: money('600.00'),
    },
  ],
  low: money('400.00'),
  typical: money('490.00'),
  high: money('600.00'),
}

const fund: FundedSource = {
  key: 'example',
  name: 'Example fund',
  kind: 'unit-rate',
  offered: money('460.00'),
  paid: money('400.00'),
  cuts: [{ reason: 'source cap $400.00', amount: money('60.00') }],
  lines: [{ key: 'gate', quantityUsed: 2, rate: '230.00', amount: money('400.00') }],
  advance: money('0.00'),
}

const funding: FundingResult = {
  sources: [fund],
  totalPaid: money('400.00'),
  landownerShare: money('90.00'),
  perPractice: [],
}

const show = (result: Partial<DesignView['result']>, missing: string[] = []) =>
  render(
    <MemoryRouter>
      <CostShareView
        design={
          {
            result,
            resolvedWith: { criteriaSet: null, costList: null, schedules: [], missing },
          } as unknown as DesignView
        }
        showNotReady={(part) => <p>{'message' in part ? part.message : part.waitingFor.join(', ')}</p>}
        chooseFunds="Choose one."
      />
    </MemoryRouter>,
  )

describe('cost and who pays', () => {
  it('names what each fund was cut by and what is left to the landowner', () => {
    show({ cost: { ok: true, value: cost }, funding: { ok: true, value: funding } })
    expect(screen.getByText('−$60.00, source cap $400.00')).toBeInTheDocument()
    expect(screen.getByText('Landowner’s share').closest('div')).toHaveTextContent('$90.00')
    expect(screen.getByRole('row', { name: /^Total/ })).toHaveTextContent('$400.00$490.00$600.00')
  })

  it('say what to ask the office for when a rule is missing, and why there is no cost', () => {
    const message = 'No cost list is in force. The office can put one in force under Costs.'
    show({ cost: { ok: false, field: 'costList', message }, funding: { ok: false, waitingFor: ['cost'] } }, [
      'No cost list is in force. An administrator puts one in force.',
    ])
    expect(screen.getByRole('region', { name: 'Ask the office' })).toHaveTextContent('An administrator puts')
    expect(screen.getByText(message)).toBeInTheDocument()
  })

  it('say that the landowner pays all when no fund is chosen', () => {
    const none = { ...funding, sources: [], totalPaid: money('0.00'), landownerShare: money('490.00') }
    show({ cost: { ok: true, value: cost }, funding: { ok: true, value: none } })
    expect(screen.getByText(/the landowner pays all of it/)).toBeInTheDocument()
  })
})
