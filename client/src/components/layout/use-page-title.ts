import { useEffect, useRef } from 'react'

let isFirstPage = true

/**
 * Names the page in the tab and moves the focus to its heading, so that a screen reader starts to read there. Not on
 * the very first page, where the browser begins at the top by itself.
 */
export function usePageTitle(title: string) {
  const heading = useRef<HTMLHeadingElement>(null)
  useEffect(() => {
    document.title = `${title} · Wadestone`
  }, [title])
  useEffect(() => {
    if (!isFirstPage) heading.current?.focus()
    isFirstPage = false
  }, [])
  return heading
}
