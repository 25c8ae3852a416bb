import { QueryClient, QueryClientProvider } from '@tanstack/react-query'
import { render, screen } from '@testing-library/react'
import { afterEach, describe, expect, it, vi } from 'vitest'
import type { PacketView } from 'shared'
import '../../i18n/i18n'
import { PageReader } from './page-reader'

const page = { number: 3, title: 'Quantities', text: ['Item · Quantity', 'Surface stone · 34.1 tons'] }
const packet = (pagesReadByMe: number[]) =>
  ({ id: 'p1', jobId: 'j1', pages: [page], pagesReadByMe }) as unknown as PacketView

function show(pagesReadByMe: number[]) {
  const fetched = vi.fn().mockResolvedValue(Response.json(packet([3])))
  vi.stubGlobal('fetch', fetched)
  render(
    <QueryClientProvider client={new QueryClient()}>
      <PageReader packet={packet(pagesReadByMe)} page={page} />
    </QueryClientProvider>,
  )
  return fetched
}

afterEach(() => vi.unstubAllGlobals())

describe('a page that is opened', () => {
  it('is told to the server as read, once', async () => {
    const fetched = show([1])
    await vi.waitFor(() => expect(fetched).toHaveBeenCalledOnce())
    const [path, options] = fetched.mock.calls[0] ?? []
    expect(path).toBe('/api/packets/p1/read-pages')
    expect(JSON.parse(options.body)).toEqual({ page: 3 })
  })

  it('is not told again when it was read before, and says that it was', () => {
    const fetched = show([3])
    expect(screen.getByRole('status')).toHaveTextContent('Read')
    expect(fetched).not.toHaveBeenCalled()
  })

  it('keeps the figures of a row apart from what they are', () => {
    show([3])
    expect(screen.getByText('Surface stone')).toBeVisible()
    expect(screen.getByText('34.1 tons')).toBeVisible()
  })
})
