import { existsSync } from 'node:fs';
import { join } from 'node:path';
import { Injectable, Logger, type OnModuleDestroy } from '@nestjs/common';
import { Piscina } from 'piscina';
import { ProblemException } from '../common/problem';
import { PROJECT_ROOT } from '../config/settings';
import { EngineError } from '../engine';
import type { WorkerAnswer } from './diagnosis.worker';
import type { JobName, Jobs } from './jobs';

/** Work that takes longer is given up. */
const LIMIT_MS = 20_000;
/** As many as the machine has cores to spare beside the request thread. */
const THREADS = 2;

/** The built worker; tests run from sources but need it built too. */
const WORKER = [
  join(__dirname, 'diagnosis.worker.js'),
  join(PROJECT_ROOT, 'service', 'dist', 'src', 'diagnosis', 'diagnosis.worker.js'),
];

/** Threads that solve circuits, so that a request never waits behind another's arithmetic. */
@Injectable()
export class DiagnosisPool implements OnModuleDestroy {
  private readonly logger = new Logger(DiagnosisPool.name);
  private pool: Piscina | null = null;

  /**
   * Runs a job on a worker.
   *
   * @throws EngineError as the engine does; ProblemException 503 when the worker died or took too long.
   */
  async run<N extends JobName>(name: N, input: Jobs[N]['input']): Promise<Jobs[N]['result']> {
    let answer: WorkerAnswer;
    try {
      answer = (await this.threads().run(
        { name, input },
        { signal: AbortSignal.timeout(LIMIT_MS) },
      )) as WorkerAnswer;
    } catch (error) {
      this.logger.error(`Job ${name} failed: ${String(error)}`);
      const isLate =
        (error as Error).name === 'AbortError' || (error as Error).name === 'TimeoutError';
      throw new ProblemException(
        503,
        isLate ? 'took-too-long' : 'worker-failed',
        isLate
          ? 'This circuit takes too long to solve. Split it, or take out what does not matter.'
          : 'The calculation stopped unexpectedly. Your readings are kept; try again.',
      );
    }
    if (!answer.ok) throw new EngineError(answer.code, answer.message, answer.problems);
    return answer.result as Jobs[N]['result'];
  }

  /** Ends the threads with the service. */
  async onModuleDestroy(): Promise<void> {
    await this.pool?.destroy();
  }

  private threads(): Piscina {
    this.pool ??= new Piscina({
      filename: WORKER.find((file) => existsSync(file)) ?? WORKER[1],
      minThreads: 1,
      maxThreads: THREADS,
      idleTimeout: 120_000,
    });
    return this.pool;
  }
}
