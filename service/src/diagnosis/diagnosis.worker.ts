import { EngineError, type NetlistProblem } from '../engine';
import { type JobName, type Jobs, runJob } from './jobs';

/** What comes back from a worker: a class does not survive the way between threads. */
export type WorkerAnswer =
  | { ok: true; result: unknown }
  | { ok: false; code: string; message: string; problems: NetlistProblem[] };

/** Entry of a worker thread. */
export default async function work({
  name,
  input,
}: {
  name: JobName;
  input: Jobs[JobName]['input'];
}): Promise<WorkerAnswer> {
  try {
    return { ok: true, result: await runJob(name, input as never) };
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    const { code, message, problems } = error;
    return { ok: false, code, message, problems };
  }
}
