import { Injectable, type OnModuleInit } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op, type WhereOptions } from 'sequelize';
import { allow, isAtLeast } from '../common/policy';
import { DatabaseService } from '../database/database.service';
import type { Knowledge } from '../engine';
import type { Person } from '../people/person.model';
import type { PartsQueryDto, PartTypeDto, PartTypesDto } from './dto/parts-data.dto';
import lampData from './lamps.json';
import { PartType } from './part-type.model';
import tubeData from './tubes.json';

/** Fields of a row that stand in columns of their own. */
type Details = Record<string, unknown>;

function present({ type, volts, amps, source, status, details }: PartType): PartTypeDto {
  return { type, volts, amps, source, status, ...(details as Partial<PartTypeDto>) };
}

/** Tubes and lamps: searched by people, taken whole by the engine. */
@Injectable()
export class PartsDataService implements OnModuleInit {
  constructor(
    private readonly database: DatabaseService,
    @InjectModel(PartType) private readonly types: typeof PartType,
  ) {}

  /** Brings the tables up to what ships with this version. */
  async onModuleInit(): Promise<void> {
    const rows = [...tubeRows(), ...lampRows()];
    if ((await this.types.count()) === rows.length) return;
    await this.database.write(async (transaction) => {
      for (const row of rows) {
        const known = await this.types.findOne({
          where: { kind: row.kind, type: row.type },
          transaction,
        });
        if (known) await known.update(row, { transaction });
        else await this.types.create(row, { transaction });
      }
    });
  }

  /** Types that fit a search, by type number. */
  async search(actor: Person, kind: 'tube' | 'lamp', query: PartsQueryDto): Promise<PartTypesDto> {
    allow(isAtLeast(actor, 'trainee'), 'Sign in to see the parts data.');
    const { search, volts, amps, limit = 50, offset = 0 } = query;
    const where: WhereOptions = { kind };
    const near = (value: number) => ({ [Op.between]: [value * 0.97, value * 1.03] });
    if (volts !== undefined) Object.assign(where, { volts: near(volts) });
    if (amps !== undefined) Object.assign(where, { amps: near(amps) });
    const rows = await this.types.findAll({ where, order: [['type', 'ASC']] });
    const words = (search ?? '').toLowerCase().split(/\s+/).filter(Boolean);
    const kept = rows.filter(({ type, details }) => {
      const text =
        `${type} ${String(details.role ?? '')} ${String(details.base ?? '')}`.toLowerCase();
      return words.every((word) => text.includes(word));
    });
    // What begins with the words comes first: 47 before 1847.
    const begins = ({ type }: PartType) =>
      words.length > 0 && type.toLowerCase().startsWith(words[0]) ? 0 : 1;
    kept.sort((x, y) => begins(x) - begins(y));
    return { total: kept.length, items: kept.slice(offset, offset + limit).map(present) };
  }

  /** Ratings a heater or lamp could have been replaced by. */
  async ratings(): Promise<Pick<Knowledge, 'tubes' | 'lamps'>> {
    const rows = await this.types.findAll();
    const of = (wanted: string) =>
      rows
        .filter(({ kind }) => kind === wanted)
        .map(({ type, volts, amps }) => ({ type, volts, amps }));
    return { tubes: of('tube'), lamps: of('lamp') };
  }
}

function tubeRows() {
  return tubeData.tubes.map(({ type, heaterVolts, heaterAmps, source, status, ...details }) => ({
    kind: 'tube' as const,
    type,
    volts: heaterVolts,
    amps: heaterAmps,
    source,
    status,
    details: details as Details,
  }));
}

function lampRows() {
  return lampData.lamps.map(({ type, volts, amps, source, status, ...details }) => ({
    kind: 'lamp' as const,
    type,
    volts,
    amps,
    source,
    status,
    details: details as Details,
  }));
}
