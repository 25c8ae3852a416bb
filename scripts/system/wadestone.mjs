import { spawnSync } from 'node:child_process'
import { readFileSync, writeFileSync } from 'node:fs'
import { join } from 'node:path'
import { startDatabase, stopDatabase, withRole } from './database.mjs'
import { portFor } from './ports.mjs'
import { root, runFolder } from './places.mjs'
import { readOrMakeSecrets } from './secrets.mjs'

const once = (script, env) => {
  const result = spawnSync(process.execPath, [join(root, 'server/dist', script)], {
    env: { ...process.env, ...env },
    encoding: 'utf8',
  })
  if (result.status !== 0) throw new Error(`${script} stopped:\n${result.stdout}${result.stderr}`)
}

async function healthy(address, hasExited) {
  for (let tries = 0; tries < 600; tries += 1) {
    if (hasExited()) throw new Error(`The server stopped at once:\n${tail(join(runFolder(), 'server.log'))}`)
    const answer = await fetch(`${address}/api/health`).catch(() => null)
    if (answer?.ok) return
    await new Promise((resolve) => setTimeout(resolve, 100))
  }
  throw new Error(`The server did not answer within a minute:\n${tail(join(runFolder(), 'server.log'))}`)
}

const tail = (file) => readFileSync(file, 'utf8').split('\n').slice(-30).join('\n')

/**
 * Starts database, mail catcher and server of a built checkout.
 * With a data folder of its own it is a throw-away Wadestone, as the tests use.
 */
export async function startWadestone({
  children,
  dataFolder,
  demo = 'on',
  wantedPort = 8460,
  wantedMailPort = 8461,
  watch = false,
  publicOrigin = process.env.PUBLIC_ORIGIN,
}) {
  const database = startDatabase(dataFolder)
  const secrets = readOrMakeSecrets(database.dataFolder)
  const port = await portFor('Wadestone', wantedPort)
  const mailPort = await portFor('the mail page', wantedMailPort)
  const smtpPort = await portFor('the mail catcher', 0)
  const address = `http://127.0.0.1:${port}`
  const env = {
    DATABASE_OWNER_URL: database.ownerUrl,
    DATABASE_URL: withRole(database.ownerUrl, 'wadestone_app', secrets.appDatabasePassword),
    APP_DATABASE_PASSWORD: secrets.appDatabasePassword,
    SECRETS_FILE: secrets.file,
    RUN_FOLDER: runFolder(),
    SMTP_URL: `smtp://127.0.0.1:${smtpPort}`,
    MAIL_FROM: process.env.MAIL_FROM ?? 'Wadestone <packets@wadestone.example>',
    HOST: '127.0.0.1',
    PORT: String(port),
    PUBLIC_ORIGIN: publicOrigin ?? address,
    DEMO: demo,
  }
  once('migrate.js', env)
  if (demo === 'on') once('seed-demo.js', env)
  const mailEnv = {
    SMTP_PORT: String(smtpPort),
    MAIL_PAGE_PORT: String(mailPort),
    MAIL_FOLDER: join(runFolder(), 'mail'),
  }
  children.start('mail catcher', [join(root, 'scripts/mail-catcher.mjs')], {
    env: mailEnv,
    logFile: join(runFolder(), 'mail-catcher.log'),
  })
  let exited = false
  children.start('server', [...(watch ? ['--watch'] : []), join(root, 'server/dist/main.js')], {
    env,
    logFile: join(runFolder(), 'server.log'),
    onExit: () => (exited = true),
  })
  await healthy(address, () => exited)
  writeFileSync(join(runFolder(), 'address'), address)
  return {
    address,
    mailPage: `http://127.0.0.1:${mailPort}`,
    dataFolder: database.dataFolder,
    hasExited: () => exited,
    env,
  }
}

export async function stopWadestone({ children, dataFolder }) {
  await children.stopAll()
  stopDatabase(dataFolder)
}
