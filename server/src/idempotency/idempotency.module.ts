import { Module } from '@nestjs/common';
import { APP_INTERCEPTOR } from '@nestjs/core';
import { SequelizeModule } from '@nestjs/sequelize';
import { IdempotencyInterceptor } from './idempotency.interceptor';
import { IdempotencyKey } from './models/idempotency-key.model';

@Module({
  imports: [SequelizeModule.forFeature([IdempotencyKey])],
  providers: [{ provide: APP_INTERCEPTOR, useClass: IdempotencyInterceptor }],
})
export class IdempotencyModule {}
