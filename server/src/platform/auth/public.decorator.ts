import { SetMetadata, type CustomDecorator } from '@nestjs/common'

export const publicKey = 'wadestone:public'

/** A route that anybody may call. */
export const Public = (): CustomDecorator => SetMetadata(publicKey, true)
