import type { Ask } from '../ask.js'
import type { DesignPartName } from '../design-parts.js'
import type { PartValues } from '../design-result.js'

/** Works one part out of what it asks for. */
export type Recipe<Part extends DesignPartName> = (ask: Ask) => PartValues[Part]

export type Recipes = { [Part in DesignPartName]: Recipe<Part> }
