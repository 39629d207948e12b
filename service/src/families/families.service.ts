import { createHash } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { allow } from '../common/policy';
import { conflict, notFound } from '../common/problem';
import { Case } from '../cases/case.model';
import { ConfirmedFault } from '../cases/confirmed-fault.model';
import { DatabaseService } from '../database/database.service';
import { type Netlist, readNetlist, requireSound } from '../engine';
import { Person } from '../people/person.model';
import type {
  CreateFamilyDto,
  CreateFamilyVersionDto,
  FamilyDto,
  FamilySummaryDto,
  SolvedDto,
} from './dto/family.dto';
import { Family, type SetKind } from './family.model';
import { canReadFamilies, canWriteFamilies } from './family.policy';
import { FamilyVersion } from './family-version.model';

/** Digest of a document, whatever the spaces in its file. */
export function contentHash(content: unknown): string {
  return createHash('sha256').update(JSON.stringify(content)).digest('hex');
}

/** Reads a netlist out of a request and refuses one that cannot be solved. */
export function soundNetlist(json: unknown): Netlist {
  const netlist = readNetlist(json);
  requireSound(netlist, []);
  return netlist;
}

/** A family as it comes from a file of the project. */
export interface FamilyFile {
  slug: string;
  name: string;
  kind: SetKind;
  tags: string[];
  description: string;
  netlist: Netlist;
}

/** The library of chassis families. */
@Injectable()
export class FamiliesService {
  constructor(
    private readonly database: DatabaseService,
    @InjectModel(Family) private readonly families: typeof Family,
    @InjectModel(FamilyVersion) private readonly versions: typeof FamilyVersion,
    @InjectModel(Case) private readonly cases: typeof Case,
    @InjectModel(ConfirmedFault) private readonly faults: typeof ConfirmedFault,
  ) {}

  /** Families by name; the search looks at names, tags and tubes. */
  async list(actor: Person, search = ''): Promise<FamilySummaryDto[]> {
    allow(canReadFamilies(actor), 'Sign in to see the families.');
    const families = await this.families.findAll({ order: [['name', 'ASC']] });
    const words = search.toLowerCase().split(/\s+/).filter(Boolean);
    const all = await Promise.all(
      families.map(async (family) => this.summary(family, await this.newest(family.id))),
    );
    return all.filter(({ name, tags, tubes, kind }) => {
      const text = [name, kind, ...tags, ...tubes].join(' ').toLowerCase();
      return words.every((word) => text.includes(word));
    });
  }

  /** One family with its newest netlist and the history of its versions. */
  async get(actor: Person, id: number): Promise<FamilyDto> {
    allow(canReadFamilies(actor), 'Sign in to see the families.');
    const family = await this.families.findByPk(id);
    if (!family) throw notFound('This family');
    const versions = await this.versions.findAll({
      where: { familyId: id },
      include: [Person],
      order: [['version', 'DESC']],
    });
    return {
      ...(await this.summary(family, versions[0])),
      netlist: versions[0].netlist,
      versions: versions.map(({ version, author, note, createdAt }) => ({
        version,
        by: author?.name ?? 'Ohmstead',
        at: createdAt.toISOString(),
        note,
      })),
      solved: await this.solved(id),
      abilities: { write: canWriteFamilies(actor) },
    };
  }

  /** Starts a family. */
  async create(
    actor: Person,
    { name, kind, tags, netlist, note }: CreateFamilyDto,
  ): Promise<FamilyDto> {
    allow(canWriteFamilies(actor), 'Senior technicians and the owner keep the library.');
    const sound = soundNetlist(netlist);
    const id = await this.database.write(async (transaction) => {
      const family = await this.families.create(
        { name: name.trim(), kind, tags: tags ?? [], description: '' },
        { transaction },
      );
      await this.addVersion(family.id, 1, sound, note ?? 'First version.', actor.id, transaction);
      return family.id;
    });
    return this.get(actor, id);
  }

  /** Adds a version; the second of two people who changed the same one is told. */
  async revise(
    actor: Person,
    id: number,
    { netlist, note, basedOn }: CreateFamilyVersionDto,
  ): Promise<FamilyDto> {
    allow(canWriteFamilies(actor), 'Senior technicians and the owner keep the library.');
    const sound = soundNetlist(netlist);
    await this.database.write(async (transaction) => {
      const newest = await this.newest(id, transaction);
      if (!newest) throw notFound('This family');
      if (newest.version !== basedOn) {
        throw conflict(
          'stale-version',
          `Somebody saved version ${newest.version} meanwhile. Compare it with yours, then save on top of it.`,
        );
      }
      await this.addVersion(id, basedOn + 1, sound, note, actor.id, transaction);
    });
    return this.get(actor, id);
  }

  /** Takes a family from a file: a new file starts one, a changed file adds a version. */
  async takeFile({ slug, name, kind, tags, description, netlist }: FamilyFile): Promise<void> {
    await this.database.write(async (transaction) => {
      const known = await this.families.findOne({ where: { slug }, transaction });
      const family =
        known ??
        (await this.families.create({ slug, name, kind, tags, description }, { transaction }));
      if (known) await known.update({ name, kind, tags, description }, { transaction });
      const hash = contentHash(netlist);
      const newest = await this.newest(family.id, transaction);
      const isKnown = await this.versions.count({
        where: { familyId: family.id, contentHash: hash },
        transaction,
      });
      if (isKnown > 0) return;
      const note = newest
        ? 'The file shipped with Ohmstead has changed.'
        : 'Shipped with Ohmstead.';
      await this.addVersion(
        family.id,
        (newest?.version ?? 0) + 1,
        netlist,
        note,
        null,
        transaction,
      );
    });
  }

  /** Confirmed faults of the family's solved cases, for priors. */
  async solved(familyId: number): Promise<SolvedDto> {
    const cases = await this.cases.findAll({
      where: { familyId, state: 'closed', outcome: ['repaired', 'no-fault'] },
      attributes: ['id'],
    });
    const rows = await this.faults.findAll({ where: { caseId: cases.map(({ id }) => id) } });
    const counts = new Map<string, { part: string; mode: ConfirmedFault['mode']; count: number }>();
    for (const { part, mode } of rows) {
      const key = `${part}:${mode}`;
      const entry = counts.get(key) ?? { part, mode, count: 0 };
      entry.count += 1;
      counts.set(key, entry);
    }
    return { cases: cases.length, faults: [...counts.values()].sort((x, y) => y.count - x.count) };
  }

  /** Newest version of a family; null when there is no such family. */
  newest(familyId: number, transaction?: Transaction): Promise<FamilyVersion | null> {
    return this.versions.findOne({
      where: { familyId },
      order: [['version', 'DESC']],
      transaction,
    });
  }

  private async addVersion(
    familyId: number,
    version: number,
    netlist: Netlist,
    note: string,
    authorId: number | null,
    transaction: Transaction,
  ): Promise<void> {
    await this.versions.create(
      { familyId, version, netlist, note, contentHash: contentHash(netlist), authorId },
      { transaction },
    );
  }

  private async summary(family: Family, newest: FamilyVersion | null): Promise<FamilySummaryDto> {
    const { id, name, kind, tags, description } = family;
    const parts = newest?.netlist.parts ?? [];
    const tubes = parts.flatMap((part) => (part.kind === 'heater' && part.tube ? [part.tube] : []));
    const solvedCases = await this.cases.count({
      where: { familyId: id, state: 'closed', outcome: ['repaired', 'no-fault'] },
    });
    return {
      id,
      name,
      kind,
      tags,
      description,
      version: newest?.version ?? 0,
      parts: parts.length,
      tubes: [...new Set(tubes)],
      solvedCases,
    };
  }
}
