import { numberText, readyValue, trimmedNumber, type DesignResult } from 'shared'

export interface PlainFigure {
  label: string
  value: string
  unit: string
}

/** Figures of the closing panel, which follow from its layout and have no working of their own. */
export function panelFigures(result: DesignResult): PlainFigure[] {
  const panel = readyValue(result.closingPanel)
  if (panel === null) return []
  return [
    { label: 'Length, two sides and the end', value: trimmedNumber(panel.lengthFt, 1), unit: 'ft' },
    { label: 'Deepest water along it', value: trimmedNumber(panel.deepestWaterFt, 2), unit: 'ft' },
    { label: 'Height at the deepest post', value: trimmedNumber(panel.heightAtDeepestPostFt, 2), unit: 'ft' },
    { label: 'Posts', value: numberText(panel.posts), unit: '' },
  ]
}
