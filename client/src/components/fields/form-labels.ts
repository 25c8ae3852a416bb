import { createContext, useContext, useEffect } from 'react'

/** Label of every field on screen by its form path: the error summary names a field as the page does. */
export const FormLabels = createContext<Map<string, string>>(new Map())

export function useFieldLabel(name: string, label: string): void {
  const labels = useContext(FormLabels)
  useEffect(() => {
    labels.set(name, label)
    return () => void labels.delete(name)
  }, [labels, name, label])
}
