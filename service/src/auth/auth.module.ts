import { Module } from '@nestjs/common';
import { APP_GUARD } from '@nestjs/core';
import { JwtModule } from '@nestjs/jwt';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuthGuard } from '../common/guards/auth.guard';
import { SETTINGS, type Settings } from '../config/settings';
import { Person } from '../people/person.model';
import { Shop } from '../people/shop.model';
import { AuthController } from './auth.controller';
import { AuthService } from './auth.service';
import { RefreshToken } from './refresh-token.model';

@Module({
  imports: [
    SequelizeModule.forFeature([Person, Shop, RefreshToken]),
    JwtModule.registerAsync({
      inject: [SETTINGS],
      useFactory: ({ jwtSecret }: Settings) => ({
        secret: jwtSecret,
        signOptions: { algorithm: 'HS256' as const },
        verifyOptions: { algorithms: ['HS256' as const] },
      }),
    }),
  ],
  controllers: [AuthController],
  providers: [AuthService, { provide: APP_GUARD, useClass: AuthGuard }],
})
export class AuthModule {}
