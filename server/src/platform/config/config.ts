import { Injectable } from '@nestjs/common'

export interface Secrets {
  jwtSecret: string
  passwordPepper: string
  cursorSecret: string
}

export interface ConfigValues {
  databaseUrl: string
  host: string
  port: number
  /** Scheme, host and port people open, as a browser sends it in the header Origin. */
  publicOrigin: string
  smtpUrl: string
  mailFrom: string
  runFolder: string
  /** The built client. */
  clientFolder: string
  /** Addresses of proxies whose word about the caller's address is taken. */
  trustedProxies: string[]
  isDemo: boolean
  /** Whether this server also works off the queue. */
  worksQueue: boolean
  secrets: Secrets
}

/** What differs from one installation to the next. Read once, when the server starts. */
@Injectable()
export class Config implements Readonly<ConfigValues> {
  readonly databaseUrl: string
  readonly host: string
  readonly port: number
  readonly publicOrigin: string
  readonly smtpUrl: string
  readonly mailFrom: string
  readonly runFolder: string
  readonly clientFolder: string
  readonly trustedProxies: string[]
  readonly isDemo: boolean
  readonly worksQueue: boolean
  readonly secrets: Secrets

  constructor(values: ConfigValues) {
    Object.assign(this, values)
  }
}
