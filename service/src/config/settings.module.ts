import { Global, Module } from '@nestjs/common';
import { readSettings, SETTINGS } from './settings';

/** Offers the checked settings to every module. */
@Global()
@Module({
  providers: [{ provide: SETTINGS, useFactory: () => readSettings(process.env) }],
  exports: [SETTINGS],
})
export class SettingsModule {}
