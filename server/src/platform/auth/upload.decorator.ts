import {
  applyDecorators,
  createParamDecorator,
  SetMetadata,
  UseInterceptors,
  type ExecutionContext,
} from '@nestjs/common'
import { FileInterceptor } from '@nestjs/platform-express'
import { memoryStorage } from 'multer'
import { Problem } from 'shared'

export const uploadKey = 'wadestone:upload'

const megabyte = 1024 * 1024
const limits = { fileSize: 2 * megabyte, files: 1, fields: 0, parts: 1 }

/** A route that takes one file in the field `file` instead of JSON. */
export const Upload = (): MethodDecorator =>
  applyDecorators(
    SetMetadata(uploadKey, true),
    UseInterceptors(FileInterceptor('file', { storage: memoryStorage(), limits })),
  )

export const UploadedBytes = createParamDecorator((_: unknown, context: ExecutionContext): Buffer => {
  const { file } = context.switchToHttp().getRequest<{ file?: { buffer: Buffer; size: number } }>()
  if (file !== undefined && file.size > 0) return file.buffer
  const message = file === undefined ? 'Choose a file.' : 'The file is empty.'
  throw new Problem('unreadable-file', { detail: message, fields: [{ pointer: '/file', message }] })
})
