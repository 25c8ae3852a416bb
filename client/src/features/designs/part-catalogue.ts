import type { DesignPart } from 'shared'
import type { PartSpec } from './part-spec'
import { closingPanelPart, fabricPart, padsPart } from './parts/cover-parts'
import { fencePart } from './parts/fence-part'
import { fundingPart } from './parts/funding-part'
import { herdPart } from './parts/herd-part'
import { pondPart, seedingPart } from './parts/land-parts'
import { earthworkPart, rampPart } from './parts/ramp-parts'
import { rockPart } from './parts/rock-part'
import { bermPart, runoffPart } from './parts/runoff-parts'
import { sitePart } from './parts/site-part'

/** The parts of a design in the order in which they are filled in. */
export const partCatalogue: readonly PartSpec[] = [
  herdPart,
  sitePart,
  rampPart,
  earthworkPart,
  rockPart,
  fabricPart,
  padsPart,
  closingPanelPart,
  fencePart,
  runoffPart,
  bermPart,
  pondPart,
  seedingPart,
  fundingPart,
]

export const designPlanParts: readonly DesignPart[] = partCatalogue.map(({ part }) => part)

/** Undefined for an address that names no part. */
export const partSpec = (part: string): PartSpec | undefined =>
  partCatalogue.find((spec) => spec.part === part)
