import 'reflect-metadata'
import { NestFactory } from '@nestjs/core'
import { hashPassword } from './accounts/password-hash.js'
import { AppModule } from './app.module.js'
import { seedDistricts } from './demo/seed-districts.js'
import { readConfig } from './platform/config/read-config.js'

// The server works the queue off; here it would only wait for a mail server that has not started yet.
const config = readConfig({ ...process.env, QUEUE: 'off' })
const app = await NestFactory.createApplicationContext(AppModule.forRoot(config), {
  logger: ['warn', 'error'],
})
try {
  const { runFolder, secrets } = config
  const said = await seedDistricts(app, {
    runFolder,
    hashPassword: (password) => hashPassword(password, secrets.passwordPepper),
  })
  console.log(said)
} finally {
  await app.close()
}
