import { useEffect, useRef } from 'react'
import { useLocation } from 'react-router-dom'

/** For a row of links that scrolls sideways on a phone: the page one is on is brought into view. */
export function useCurrentInView() {
  const { pathname } = useLocation()
  const bar = useRef<HTMLElement>(null)
  useEffect(() => {
    const current = bar.current?.querySelector<HTMLElement>('[aria-current="page"]')
    current?.scrollIntoView?.({ block: 'nearest', inline: 'center' })
  }, [pathname])
  return bar
}
