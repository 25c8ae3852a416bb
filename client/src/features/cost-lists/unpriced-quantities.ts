import { quantityCatalogue, quantityKeys, type CostListInput } from 'shared'

/** Quantities a list has no price for: a design that holds one of them could not be priced. */
export const unpricedQuantities = ({ lines }: Pick<CostListInput, 'lines'>): string[] =>
  quantityKeys
    .filter((key) => !lines.some((line) => line.key === key))
    .map((key) => quantityCatalogue[key].description)
