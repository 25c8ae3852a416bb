import type { NestExpressApplication } from '@nestjs/platform-express'
import compression from 'compression'
import cookieParser from 'cookie-parser'
import type { RequestHandler } from 'express'
import helmet from 'helmet'
import type { Config } from '../config/config.js'
import { serveSpa } from './serve-spa.js'

/** No answer of the API is for a cache: it belongs to one person at one moment. */
const noStore: RequestHandler = (_request, response, next) => {
  response.set('Cache-Control', 'no-store')
  next()
}

function securityHeaders({ publicOrigin }: Config): RequestHandler {
  const isHttps = publicOrigin.startsWith('https:')
  return helmet({
    strictTransportSecurity: isHttps,
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'self'"],
        frameSrc: ["'self'"],
        imgSrc: ["'self'", 'data:', 'blob:'],
        objectSrc: ["'self'"],
        // The style library writes its rules into the page.
        styleSrc: ["'self'", "'unsafe-inline'"],
        ...(isHttps ? { upgradeInsecureRequests: [] } : {}),
      },
    },
  })
}

export function configureWeb(app: NestExpressApplication, config: Config): void {
  app.set('trust proxy', config.trustedProxies.length > 0 ? config.trustedProxies : false)
  app.set('query parser', 'simple')
  app.disable('x-powered-by')
  app.disable('etag')
  app.use(securityHeaders(config), compression(), cookieParser())
  app.use('/api', noStore)
  app.useBodyParser('json', { limit: '1mb' })
  app.use(serveSpa(config.clientFolder))
  app.setGlobalPrefix('api')
  app.enableShutdownHooks()
}
