import { join } from 'node:path'
import express, { type RequestHandler } from 'express'

const forever = 'public, max-age=31536000, immutable'

/**
 * Serves the built client beside the API. Every address of the client is the same page; a missing file is missing,
 * and never that page under another name.
 */
export function serveSpa(folder: string): RequestHandler {
  const files = express.static(folder, {
    index: false,
    redirect: false,
    setHeaders: (response, path) =>
      response.set('Cache-Control', path.startsWith(join(folder, 'assets')) ? forever : 'no-cache'),
  })
  return (request, response, next) => {
    const isApi = request.path === '/api' || request.path.startsWith('/api/')
    if (isApi || !['GET', 'HEAD'].includes(request.method)) return next()
    files(request, response, (error?: unknown) => {
      if (error !== undefined) return next(error)
      const isFile = /\.[a-z0-9]+$/i.test(request.path)
      if (isFile) return void response.status(404).type('text').send('There is no such file.')
      response.set('Cache-Control', 'no-cache')
      response.sendFile(join(folder, 'index.html'), { cacheControl: false }, (failure) => {
        if (failure && !response.headersSent)
          response.status(404).type('text').send('The client is not built.')
      })
    })
  }
}
