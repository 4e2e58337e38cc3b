import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { PassportModule } from '@nestjs/passport';
import { TypeOrmModule } from '@nestjs/typeorm';
import { Environment } from '../config/environment';
import { Person } from '../people/person.entity';
import { AccessGuard } from './access.guard';
import { AccessTokenStrategy } from './access-token.strategy';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { Passwords } from './passwords';
import { Session } from './session.entity';
import { SessionsService } from './sessions.service';
import { SignInTries } from './sign-in-tries';

@Module({
  imports: [
    TypeOrmModule.forFeature([Person, Session]),
    PassportModule,
    JwtModule.registerAsync({
      inject: [Environment],
      useFactory: ({ JWT_SECRET }: Environment) => ({
        secret: JWT_SECRET,
        signOptions: { algorithm: 'HS256' },
        verifyOptions: { algorithms: ['HS256'] },
      }),
    }),
  ],
  controllers: [AuthController],
  providers: [
    AuthService,
    SessionsService,
    SignInTries,
    Passwords,
    AccessTokenStrategy,
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
  exports: [Passwords],
})
export class AuthModule {}
