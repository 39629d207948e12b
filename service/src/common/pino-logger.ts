import type { LoggerService } from '@nestjs/common';
import pino from 'pino';

/** Nest's messages as structured log lines. Start-up chatter stays below the level that is shown. */
export class PinoLogger implements LoggerService {
  private readonly pino = pino({ level: process.env.LOG_LEVEL ?? 'info', base: undefined });

  log(message: unknown, context?: string): void {
    this.pino.debug({ context }, String(message));
  }
  warn(message: unknown, context?: string): void {
    this.pino.warn({ context }, String(message));
  }
  error(message: unknown, stack?: string, context?: string): void {
    this.pino.error({ context, stack }, String(message));
  }
  debug(message: unknown, context?: string): void {
    this.pino.debug({ context }, String(message));
  }
}
