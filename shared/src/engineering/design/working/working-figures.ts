import type { Ask } from '../ask.js'
import type { WorkingFigure } from '../working-figure.js'
import { bermWorking } from './berm-working.js'
import { earthworkWorking } from './earthwork-working.js'
import type { PartWorking } from './figure.js'
import { fenceWorking } from './fence-working.js'
import { herdWorking } from './herd-working.js'
import { pondWorking, seedingWorking } from './land-working.js'
import { profileWorking } from './profile-working.js'
import { runoffWorking } from './runoff-working.js'
import { fabricWorking, padWorking, rockWorking } from './surface-working.js'

const inOrder: readonly PartWorking[] = [
  herdWorking,
  profileWorking,
  earthworkWorking,
  rockWorking,
  fabricWorking,
  padWorking,
  fenceWorking,
  runoffWorking,
  bermWorking,
  pondWorking,
  seedingWorking,
]

/** How each figure of the ready parts was found, in the order in which the parts are shown. */
export const workingFigures = (ask: Ask): WorkingFigure[] => inOrder.flatMap((working) => working(ask))
