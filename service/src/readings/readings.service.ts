import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op, type Transaction } from 'sequelize';
import type { Case } from '../cases/case.model';
import { CasesService } from '../cases/cases.service';
import { canReadCases, canRecord } from '../cases/case.policy';
import { allow } from '../common/policy';
import { conflict, notFound, ProblemException } from '../common/problem';
import { DatabaseService } from '../database/database.service';
import { applyAsFound, checkReading, type Meter, type Reading, type Take } from '../engine';
import { MetersService } from '../meters/meters.service';
import { Person } from '../people/person.model';
import {
  type CaseReadingDto,
  type EnterReadingDto,
  type EnterReadingsDto,
  presentReading,
} from './dto/reading.dto';
import { placeOf, ReadingRow } from './reading.model';

/** Readings with the set switched on. */
const POWERED: readonly Take[] = ['ac-volts', 'dc-volts', 'ripple-volts', 'amps'];

/** Readings of a case, with their history. */
@Injectable()
export class ReadingsService {
  constructor(
    private readonly database: DatabaseService,
    private readonly cases: CasesService,
    private readonly meters: MetersService,
    @InjectModel(ReadingRow) private readonly readings: typeof ReadingRow,
  ) {}

  /** Readings of a case by time; with `history` also the replaced and withdrawn ones. */
  async list(
    actor: Person,
    caseId: number,
    hasHistory: boolean,
    place?: string,
  ): Promise<CaseReadingDto[]> {
    allow(canReadCases(actor), 'Sign in to see the readings.');
    await this.cases.find(caseId);
    const rows = await this.readings.findAll({
      where: {
        caseId,
        ...(hasHistory ? {} : { replacedAt: null, withdrawnAt: null }),
        ...(place === undefined ? {} : { place }),
      },
      include: [Person],
      order: [['id', 'ASC']],
    });
    return rows.map(presentReading);
  }

  /** Enters readings, all or none; each takes the place of an earlier one at the same spot. */
  async enter(
    actor: Person,
    caseId: number,
    { readings }: EnterReadingsDto,
  ): Promise<CaseReadingDto[]> {
    const found = await this.cases.find(caseId);
    allow(canRecord(actor, found), 'A closed case takes no readings. Reopen it first.');
    this.check(found, readings);
    if (
      readings.some(({ take }) => POWERED.includes(take)) &&
      !(await this.cases.hasAcknowledged(caseId, actor.id))
    ) {
      throw conflict(
        'cautions-not-acknowledged',
        'Read the cautions of this set before you enter readings with the power on.',
      );
    }
    const meters = await this.meters.settingsOf(
      actor,
      readings.map(({ meterId }) => meterId),
    );
    const ids = await this.database.write(async (transaction) => {
      const out: number[] = [];
      for (const reading of readings) {
        const meter = reading.meterId === undefined ? null : (meters.get(reading.meterId) ?? null);
        out.push(await this.enterOne(actor, caseId, reading, meter, transaction));
      }
      return out;
    });
    const rows = await this.readings.findAll({ where: { id: ids }, include: [Person] });
    const byId = new Map(rows.map((row) => [row.id, row]));
    return ids.map((id) => presentReading(byId.get(id)!));
  }

  /** Takes a reading back; it stays in the history, and the one before it counts again. */
  async withdraw(actor: Person, caseId: number, readingId: number): Promise<void> {
    const found = await this.cases.find(caseId);
    allow(canRecord(actor, found), 'A closed case is not changed. Reopen it first.');
    await this.database.write(async (transaction) => {
      const row = await this.readings.findOne({ where: { id: readingId, caseId }, transaction });
      if (!row) throw notFound('This reading');
      if (row.withdrawnAt) return;
      await row.update({ withdrawnAt: new Date() }, { transaction });
      await this.readings.update(
        { replacedAt: null, replacedById: null },
        { where: { caseId, replacedById: row.id, withdrawnAt: null }, transaction },
      );
    });
  }

  /** Readings that count, for the engine. */
  current(caseId: number): Promise<ReadingRow[]> {
    return this.readings.findAll({
      where: { caseId, replacedAt: null, withdrawnAt: null },
      order: [['id', 'ASC']],
    });
  }

  /** Refuses readings that do not fit the circuit, each at its field. */
  private check(found: Case, readings: readonly EnterReadingDto[]): void {
    const netlist = applyAsFound(found.netlist, found.asFound);
    const errors = readings.flatMap(({ take, at, part, value, seen }, i) =>
      checkReading(netlist, { take, at, part, value, seen } as Reading).map(
        ({ path, message, code }) => ({
          pointer: `/readings/${i}${path ?? ''}`,
          message,
          code,
        }),
      ),
    );
    if (errors.length > 0) {
      throw new ProblemException(
        422,
        'reading-refused',
        errors.map(({ message }) => message).join(' '),
        errors,
      );
    }
  }

  private async enterOne(
    actor: Person,
    caseId: number,
    { clientId, take, at, part, value, seen, note }: EnterReadingDto,
    meter: Meter | null,
    transaction: Transaction,
  ): Promise<number> {
    if (clientId) {
      const known = await this.readings.findOne({ where: { caseId, clientId }, transaction });
      if (known) return known.id;
    }
    const place = placeOf({ take, at, part });
    const row = await this.readings.create(
      {
        caseId,
        clientId: clientId ?? null,
        take,
        place,
        red: at?.[0] ?? null,
        black: at?.[1] ?? null,
        part: part ?? null,
        value: value === undefined ? null : String(value),
        seen: seen ?? null,
        meter,
        note: note ?? '',
        takenById: actor.id,
      },
      { transaction },
    );
    await this.readings.update(
      { replacedAt: new Date(), replacedById: row.id },
      {
        where: { caseId, place, replacedAt: null, withdrawnAt: null, id: { [Op.ne]: row.id } },
        transaction,
      },
    );
    return row.id;
  }
}
