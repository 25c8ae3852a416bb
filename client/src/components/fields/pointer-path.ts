/**
 * A JSON pointer of the server, such as /plan/ramp/widthFt, as a path of the form: ramp.widthFt when the form holds
 * what lies under /plan.
 */
export function pointerPath(pointer: string, under = ''): string | null {
  if (under !== '' && pointer !== under && !pointer.startsWith(`${under}/`)) return null
  return pointer
    .slice(under.length)
    .split('/')
    .filter((part) => part !== '')
    .map((part) => part.replaceAll('~1', '/').replaceAll('~0', '~'))
    .join('.')
}
