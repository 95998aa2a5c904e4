import { Module } from '@nestjs/common';
import { ENV } from '../config/config.module.js';
import { SIGNING_KEY, signingKeyFrom } from './signing-key.js';

@Module({
  providers: [{ provide: SIGNING_KEY, inject: [ENV], useFactory: signingKeyFrom }],
  exports: [SIGNING_KEY],
})
export class SigningKeyModule {}
