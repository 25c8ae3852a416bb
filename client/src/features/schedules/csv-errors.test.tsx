import { render, screen } from '@testing-library/react'
import { describe, expect, it } from 'vitest'
import { CsvErrors } from './csv-errors'

describe('faults of a CSV file', () => {
  it('stand by row and column, each with what would be right', () => {
    const message = 'Row 3, column "base_rate" is "abc". Give a rate in dollars.'
    render(<CsvErrors errors={[{ row: 3, column: 'base_rate', message }]} />)
    const [, row] = screen.getAllByRole('row')
    expect(row).toHaveTextContent(`3base_rate${message}`)
    expect(screen.getByRole('alert')).toHaveTextContent('One place of the file could not be read')
  })
})
