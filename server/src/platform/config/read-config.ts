import { readFileSync } from 'node:fs'
import { fileURLToPath } from 'node:url'
import { z } from 'zod'
import { Config, type Secrets } from './config.js'

const onOrOff = z.enum(['on', 'off'])
const builtClient = new URL('../../../../client/dist', import.meta.url)

const environmentSchema = z.object({
  DATABASE_URL: z.url('DATABASE_URL must be the address of the database, as the role wadestone_app'),
  HOST: z.string().default('127.0.0.1'),
  PORT: z.coerce.number().int().min(0).max(65535).default(8460),
  PUBLIC_ORIGIN: z.url().optional(),
  SMTP_URL: z.url('SMTP_URL must be the address of the mail server, such as smtp://127.0.0.1:25'),
  MAIL_FROM: z.string().min(3),
  SECRETS_FILE: z.string().min(1, 'SECRETS_FILE must name the file with the secrets'),
  RUN_FOLDER: z.string().default('.run'),
  CLIENT_FOLDER: z.string().optional(),
  TRUSTED_PROXIES: z.string().default(''),
  DEMO: onOrOff.default('off'),
  QUEUE: onOrOff.default('on'),
})

const secret = z.string().min(32, 'A secret has at least 32 characters')
const secretsSchema = z.object({ jwtSecret: secret, passwordPepper: secret, cursorSecret: secret })

export function readConfig(environment: NodeJS.ProcessEnv): Config {
  const values = parse(environmentSchema, environment, 'The environment is not complete')
  return new Config({
    databaseUrl: values.DATABASE_URL,
    host: values.HOST,
    port: values.PORT,
    publicOrigin: new URL(values.PUBLIC_ORIGIN ?? `http://${values.HOST}:${values.PORT}`).origin,
    smtpUrl: values.SMTP_URL,
    mailFrom: values.MAIL_FROM,
    runFolder: values.RUN_FOLDER,
    clientFolder: values.CLIENT_FOLDER ?? fileURLToPath(builtClient),
    trustedProxies: values.TRUSTED_PROXIES.split(',')
      .map((text) => text.trim())
      .filter((text) => text !== ''),
    isDemo: values.DEMO === 'on',
    worksQueue: values.QUEUE === 'on',
    secrets: readSecrets(values.SECRETS_FILE),
  })
}

export function readSecrets(file: string): Secrets {
  return parse(
    secretsSchema,
    JSON.parse(readFileSync(file, 'utf8')),
    `The secrets in ${file} are not complete`,
  )
}

/** Says which value is wrong and why, and never what the value was. */
function parse<T>(schema: z.ZodType<T>, value: unknown, sentence: string): T {
  const result = schema.safeParse(value)
  if (result.success) return result.data
  const wrong = result.error.issues.map((issue) => `${issue.path.join('.')}: ${issue.message}`)
  throw new Error(`${sentence}. ${wrong.join('; ')}`)
}
