import { Injectable } from '@nestjs/common';
import { DiagnosisPool } from '../diagnosis/diagnosis-pool';
import {
  type AsFound,
  checkNetlist,
  EngineError,
  importCsv,
  type Netlist,
  readNetlist,
} from '../engine';
import { allow, isAtLeast } from '../common/policy';
import type { Person } from '../people/person.model';
import type {
  CheckedCircuitDto,
  ImportCsvDto,
  ImportedCircuitDto,
  SolveCircuitDto,
  SolvedCircuitDto,
} from './dto/circuits.dto';

const READERS = 'Sign in to work on circuits.';

/** Circuits that belong to nobody yet: checked, imported, solved. */
@Injectable()
export class CircuitsService {
  constructor(private readonly pool: DiagnosisPool) {}

  /** Every problem of a netlist; an empty list when it can be solved. */
  check(actor: Person, json: unknown): CheckedCircuitDto {
    allow(isAtLeast(actor, 'trainee'), READERS);
    try {
      return { problems: checkNetlist(readNetlist(json)) };
    } catch (error) {
      if (error instanceof EngineError) return { problems: error.problems };
      throw error;
    }
  }

  /** Reads parts from CSV and says what is still missing to make a circuit of them. */
  importCsv(actor: Person, { csv, title, reference, line }: ImportCsvDto): ImportedCircuitDto {
    allow(isAtLeast(actor, 'trainee'), READERS);
    const { parts } = importCsv(csv);
    const netlist = {
      ohmstead: 1,
      title,
      reference,
      ...(line ? { line } : {}),
      parts,
    } as unknown as Netlist;
    return { netlist, problems: this.check(actor, netlist).problems };
  }

  /** The healthy set: volts, amps and watts everywhere. */
  async solve(
    actor: Person,
    { netlist, asFound, lineVolts }: SolveCircuitDto,
  ): Promise<SolvedCircuitDto> {
    allow(isAtLeast(actor, 'trainee'), READERS);
    const sound = readNetlist(netlist);
    const healthy = await this.pool.run('solve', {
      netlist: sound,
      asFound: asFound as unknown as AsFound[] | undefined,
      conditions: { lineVolts },
    });
    return { healthy };
  }
}
