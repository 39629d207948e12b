import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { allow, isAtLeast } from '../common/policy';
import { badField } from '../common/problem';
import { DatabaseService } from '../database/database.service';
import type { Meter } from '../engine';
import type { Person } from '../people/person.model';
import type { CreateMeterDto, MeterDto } from './dto/meter.dto';
import { MeterRow } from './meter.model';

function present({ id, name, settings }: MeterRow): MeterDto {
  return { id, name, ...settings };
}

/** Meters, each person their own. */
@Injectable()
export class MetersService {
  constructor(
    private readonly database: DatabaseService,
    @InjectModel(MeterRow) private readonly meters: typeof MeterRow,
  ) {}

  /** The person's meters. */
  async list(actor: Person): Promise<MeterDto[]> {
    allow(isAtLeast(actor, 'trainee'), 'Sign in to see your meters.');
    const rows = await this.meters.findAll({
      where: { personId: actor.id },
      order: [['id', 'ASC']],
    });
    return rows.map(present);
  }

  /** Remembers a meter. */
  async create(actor: Person, { name, ...settings }: CreateMeterDto): Promise<MeterDto> {
    allow(isAtLeast(actor, 'trainee'), 'Sign in to keep meters.');
    if (settings.ohmsPerVolt !== undefined && settings.fullScale === undefined) {
      throw badField(
        '/fullScale',
        'A meter given in ohms per volt needs the full scale of its range.',
      );
    }
    const row = await this.database.write((transaction) =>
      this.meters.create({ personId: actor.id, name: name.trim(), settings }, { transaction }),
    );
    return present(row);
  }

  /**
   * Settings of the meters named, all of them the person's own.
   *
   * @throws ProblemException at the first reading whose meter is not.
   */
  async settingsOf(
    actor: Person,
    ids: readonly (number | undefined)[],
  ): Promise<Map<number, Meter>> {
    const rows = await this.meters.findAll({ where: { personId: actor.id } });
    const known = new Map(rows.map(({ id, settings }) => [id, settings]));
    ids.forEach((id, i) => {
      if (id !== undefined && !known.has(id)) {
        throw badField(
          `/readings/${i}/meterId`,
          'This is not one of your meters. Choose another one.',
        );
      }
    });
    return known;
  }
}
