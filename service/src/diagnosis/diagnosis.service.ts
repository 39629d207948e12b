import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Case } from '../cases/case.model';
import { canReadCases } from '../cases/case.policy';
import { CasesService } from '../cases/cases.service';
import { allow } from '../common/policy';
import { badField, notFound } from '../common/problem';
import { DatabaseService } from '../database/database.service';
import { type DiagnosisInput, ENGINE_VERSION, type Knowledge, type Reading } from '../engine';
import { FamiliesService } from '../families/families.service';
import { PartsDataService } from '../parts-data/parts-data.service';
import type { Person } from '../people/person.model';
import { asReading, placeOf, type ReadingRow } from '../readings/reading.model';
import { ReadingsService } from '../readings/readings.service';
import { RulesService } from '../rules/rules.service';
import { DiagnosisPool } from './diagnosis-pool';
import { DiagnosisRow } from './diagnosis.model';
import {
  type AskClosedFormDto,
  type ClosedFormDto,
  type CompareDto,
  type DiagnosisDto,
  presentDiagnosis,
  type WorkingDto,
} from './dto/diagnosis.dto';

const READERS = 'Sign in to see the diagnosis.';

/** Puts a case before the engine and keeps what it answers. */
@Injectable()
export class DiagnosisService {
  constructor(
    private readonly database: DatabaseService,
    private readonly pool: DiagnosisPool,
    private readonly cases: CasesService,
    private readonly readings: ReadingsService,
    private readonly families: FamiliesService,
    private readonly partsData: PartsDataService,
    private readonly rules: RulesService,
    @InjectModel(DiagnosisRow) private readonly diagnoses: typeof DiagnosisRow,
  ) {}

  /** Ranks the suspects of a case; the same inputs get the stored answer. */
  async diagnose(actor: Person, caseId: number): Promise<DiagnosisDto> {
    allow(canReadCases(actor), READERS);
    const found = await this.cases.find(caseId);
    const rows = await this.readings.current(caseId);
    const input: DiagnosisInput = {
      ...circuitOf(found),
      readings: rows.map(asReading),
      knowledge: await this.knowledgeFor(found),
    };
    const inputHash = createHash('sha256')
      .update(ENGINE_VERSION)
      .update(JSON.stringify(input))
      .digest('hex');
    const known = await this.diagnoses.findOne({ where: { caseId, inputHash } });
    if (known) return presentDiagnosis(known);
    const start = performance.now();
    const result = await this.pool.run('diagnose', input);
    const ms = Math.round(performance.now() - start);
    const row = await this.database.write((transaction) =>
      this.diagnoses.create(
        {
          caseId,
          inputHash,
          engineVersion: result.engineVersion,
          readingIds: rows.map(({ id }) => id),
          result,
          ms,
          askedById: actor.id,
        },
        { transaction },
      ),
    );
    return presentDiagnosis(row);
  }

  /** The newest ranking of a case. */
  async latest(actor: Person, caseId: number): Promise<DiagnosisDto> {
    allow(canReadCases(actor), READERS);
    await this.cases.find(caseId);
    const row = await this.diagnoses.findOne({ where: { caseId }, order: [['id', 'DESC']] });
    if (!row) throw notFound('A diagnosis of this case');
    return presentDiagnosis(row);
  }

  /** Measured beside computed, at every point and part. */
  async compare(actor: Person, caseId: number): Promise<CompareDto> {
    allow(canReadCases(actor), READERS);
    const found = await this.cases.find(caseId);
    const rows = await this.readings.current(caseId);
    const points = await this.pool.run('compare', {
      ...circuitOf(found),
      readings: rows.map(asReading),
    });
    return { points, lineVolts: found.lineVolts ?? found.netlist.line?.volts ?? 0 };
  }

  /** The equations of the healthy set and their solution. */
  async working(actor: Person, caseId: number): Promise<WorkingDto> {
    allow(canReadCases(actor), READERS);
    return this.pool.run('working', circuitOf(await this.cases.find(caseId)));
  }

  /** How one reading hangs on one part, and what the part would have to be. */
  async closedForm(actor: Person, caseId: number, ask: AskClosedFormDto): Promise<ClosedFormDto> {
    allow(canReadCases(actor), READERS);
    const found = await this.cases.find(caseId);
    const reading = this.readingAsked(await this.readings.current(caseId), ask);
    if (!found.netlist.parts.some(({ ref }) => ref === ask.part)) {
      throw badField('/part', `There is no part ${ask.part} in this circuit.`);
    }
    const form = await this.pool.run('closed-form', {
      ...circuitOf(found),
      part: ask.part,
      reading,
    });
    return form as unknown as ClosedFormDto;
  }

  private readingAsked(
    rows: readonly ReadingRow[],
    { take, at, readingPart }: AskClosedFormDto,
  ): Reading {
    const place = placeOf({ take, at, part: readingPart });
    const row = rows.find((one) => one.place === place);
    if (!row) throw badField('/take', 'This reading has not been taken yet. Choose one that has.');
    return asReading(row);
  }

  private async knowledgeFor({ familyId }: Case): Promise<Knowledge> {
    const [ratings, rules, solved] = await Promise.all([
      this.partsData.ratings(),
      this.rules.active(),
      familyId === null ? undefined : this.families.solved(familyId),
    ]);
    return { ...ratings, rules, ...(solved ? { solved } : {}) };
  }
}

function circuitOf({ netlist, asFound, lineVolts }: Case) {
  return { netlist, asFound, conditions: lineVolts === null ? {} : { lineVolts } };
}
