import { SetMetadata, type CustomDecorator } from '@nestjs/common'
import type { Permission } from 'shared'

/** `signed-in` is for what a person does with the own account. */
export type Requirement = Permission | 'signed-in'

export const requiresKey = 'wadestone:requires'

/** What a route asks of its caller. How far it reaches is decided by the service that knows the thing asked for. */
export const Requires = (requirement: Requirement): CustomDecorator => SetMetadata(requiresKey, requirement)
