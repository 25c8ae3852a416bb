import { Global, Module } from '@nestjs/common'
import { APP_GUARD } from '@nestjs/core'
import { JwtModule } from '@nestjs/jwt'
import { PassportModule } from '@nestjs/passport'
import { Config } from '../config/config.js'
import { AccessGuard } from './access.guard.js'
import { JwtStrategy } from './jwt.strategy.js'
import { RequestShapeGuard } from './request-shape.guard.js'
import { SessionCookies } from './session-cookies.service.js'
import { tokenAlgorithm, tokenAudience, tokenSeconds } from './session-token.js'

/** Needs a `CallerLookup` from whoever keeps the sessions. */
@Global()
@Module({
  imports: [
    PassportModule,
    JwtModule.registerAsync({
      inject: [Config],
      useFactory: ({ secrets }: Config) => ({
        secret: secrets.jwtSecret,
        signOptions: { algorithm: tokenAlgorithm, audience: tokenAudience, expiresIn: tokenSeconds },
      }),
    }),
  ],
  providers: [
    SessionCookies,
    JwtStrategy,
    { provide: APP_GUARD, useClass: RequestShapeGuard },
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [SessionCookies],
})
export class AuthModule {}
