import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op, type Transaction, type WhereOptions } from 'sequelize';
import { allow } from '../common/policy';
import { badField, conflict, notFound } from '../common/problem';
import { DatabaseService } from '../database/database.service';
import { applyAsFound, type AsFound, modesOf, type Netlist, requireSound } from '../engine';
import { FamiliesService, soundNetlist } from '../families/families.service';
import { Family } from '../families/family.model';
import { Person } from '../people/person.model';
import { ReadingRow } from '../readings/reading.model';
import { Case } from './case.model';
import { canCloseCase, canEditCase, canOpenCase, canReadCases, canReopenCase } from './case.policy';
import { CautionAcknowledgement } from './caution-acknowledgement.model';
import { ConfirmedFault } from './confirmed-fault.model';
import { type CaseDto, type CaseSummaryDto, presentCase, presentSummary } from './dto/case.dto';
import type {
  ChangeCaseDto,
  CloseCaseDto,
  ConfirmFaultDto,
  OpenCaseDto,
} from './dto/change-case.dto';

const WITH_PEOPLE = [
  Family,
  { model: Person, as: 'openedBy' },
  { model: Person, as: 'assignedTo' },
];

/** What a list of cases may be narrowed by. */
export interface CaseFilter {
  state?: string;
  search?: string;
  isMine?: boolean;
}

/** Cases, from the counter to the shelf. */
@Injectable()
export class CasesService {
  constructor(
    private readonly database: DatabaseService,
    private readonly families: FamiliesService,
    @InjectModel(Case) private readonly cases: typeof Case,
    @InjectModel(ConfirmedFault) private readonly faults: typeof ConfirmedFault,
    @InjectModel(CautionAcknowledgement) private readonly cautions: typeof CautionAcknowledgement,
    @InjectModel(ReadingRow) private readonly readings: typeof ReadingRow,
    @InjectModel(Person) private readonly people: typeof Person,
  ) {}

  /** Cases, newest change first; `state` may be `open` for all that are not closed. */
  async list(actor: Person, { state, search, isMine }: CaseFilter): Promise<CaseSummaryDto[]> {
    allow(canReadCases(actor), 'Sign in to see the cases.');
    const where: WhereOptions = {};
    if (state === 'open' || !state) Object.assign(where, { state: { [Op.ne]: 'closed' } });
    else if (state !== 'all') Object.assign(where, { state });
    if (isMine)
      Object.assign(where, { [Op.or]: [{ assignedToId: actor.id }, { openedById: actor.id }] });
    const found = await this.cases.findAll({
      where,
      include: WITH_PEOPLE,
      order: [['updatedAt', 'DESC']],
      limit: 500,
    });
    const words = (search ?? '').toLowerCase().split(/\s+/).filter(Boolean);
    const kept = found.filter(({ number, setName, complaint, family }) => {
      const text = [number, setName, complaint, family?.name ?? ''].join(' ').toLowerCase();
      return words.every((word) => text.includes(word));
    });
    const counts = await this.countReadings(kept.map(({ id }) => id));
    return kept.map((one) => presentSummary(one, counts.get(one.id) ?? 0));
  }

  /** One case whole. */
  async get(actor: Person, id: number): Promise<CaseDto> {
    allow(canReadCases(actor), 'Sign in to see the cases.');
    return this.present(actor, await this.find(id));
  }

  /** Opens a case on a family's newest circuit or on a netlist of its own. */
  async open(actor: Person, body: OpenCaseDto): Promise<CaseDto> {
    allow(canOpenCase(actor), 'Sign in to open a case.');
    const circuit = await this.circuitFor(body);
    const id = await this.database.write(async (transaction) => {
      const made = await this.cases.create(
        {
          number: await this.nextNumber(transaction),
          setName: body.set.trim(),
          complaint: body.complaint.trim(),
          earlierWork: body.earlierWork?.trim() ?? '',
          state: 'on-the-bench',
          lineVolts: body.lineVolts ?? null,
          ...circuit,
          asFound: [],
          openedById: actor.id,
          assignedToId: actor.id,
        },
        { transaction },
      );
      return made.id;
    });
    return this.get(actor, id);
  }

  /** Changes what is known of a set; the second of two people is told. */
  async change(actor: Person, id: number, body: ChangeCaseDto): Promise<CaseDto> {
    const found = await this.find(id);
    allow(canEditCase(actor, found), 'A closed case is not changed. Reopen it first.');
    const { set, complaint, earlierWork, lineVolts, state, assignedToId } = body;
    const netlist = body.netlist === undefined ? found.netlist : soundNetlist(body.netlist);
    const asFound = (body.asFound as unknown as AsFound[] | undefined) ?? found.asFound;
    if (body.asFound !== undefined || body.netlist !== undefined) {
      requireSound(applyAsFound(netlist, asFound), []);
    }
    if (assignedToId !== undefined && !(await this.people.findByPk(assignedToId))) {
      throw badField('/assignedToId', 'There is nobody like that in the shop.');
    }
    await this.database.write(async (transaction) => {
      const [count] = await this.cases.update(
        {
          ...(set === undefined ? {} : { setName: set.trim() }),
          ...(complaint === undefined ? {} : { complaint: complaint.trim() }),
          ...(earlierWork === undefined ? {} : { earlierWork }),
          ...(lineVolts === undefined ? {} : { lineVolts }),
          ...(state === undefined ? {} : { state }),
          ...(assignedToId === undefined ? {} : { assignedToId }),
          netlist,
          asFound,
          version: body.version + 1,
        },
        { where: { id, version: body.version }, transaction },
      );
      if (count === 0) {
        throw conflict(
          'stale-version',
          'Somebody changed this case meanwhile. Reload it; what you typed is still here.',
        );
      }
    });
    return this.get(actor, id);
  }

  /** Records that a person has read the cautions of this case. */
  async acknowledgeCautions(actor: Person, id: number): Promise<CaseDto> {
    const found = await this.find(id);
    allow(canReadCases(actor), 'Sign in to see the cases.');
    await this.database.write((transaction) =>
      this.cautions.findOrCreate({ where: { caseId: found.id, personId: actor.id }, transaction }),
    );
    return this.get(actor, id);
  }

  /** Closes a case; its confirmed faults join the family's experience. */
  async close(
    actor: Person,
    id: number,
    { outcome, confirmedFaults, note }: CloseCaseDto,
  ): Promise<CaseDto> {
    const found = await this.find(id);
    allow(canCloseCase(actor, found), 'A technician closes cases. Ask one to look at yours.');
    if (outcome === 'repaired' && confirmedFaults.length === 0) {
      throw badField(
        '/confirmedFaults',
        'Name the part that was bad, or close the case as “no fault found”.',
      );
    }
    if (outcome === 'not-repaired' && !note?.trim()) {
      throw badField('/note', 'Say why the set was not repaired.');
    }
    confirmedFaults.forEach((fault, i) => checkFault(found.netlist, fault, i));
    await this.database.write(async (transaction) => {
      await this.faults.destroy({ where: { caseId: id }, transaction });
      await this.faults.bulkCreate(
        confirmedFaults.map(({ part, mode }) => ({ caseId: id, part, mode })),
        { transaction },
      );
      await found.update(
        {
          state: 'closed',
          outcome,
          closingNote: note?.trim() ?? null,
          closedAt: new Date(),
          closedById: actor.id,
          version: found.version + 1,
        },
        { transaction },
      );
    });
    return this.get(actor, id);
  }

  /** Takes a case back from the shelf; its faults no longer count for the family. */
  async reopen(actor: Person, id: number): Promise<CaseDto> {
    const found = await this.find(id);
    allow(canReopenCase(actor, found), 'Only a closed case can be reopened, by a technician.');
    await this.database.write(async (transaction) => {
      await this.faults.destroy({ where: { caseId: id }, transaction });
      await found.update(
        {
          state: 'on-the-bench',
          outcome: null,
          closedAt: null,
          closedById: null,
          version: found.version + 1,
        },
        { transaction },
      );
    });
    return this.get(actor, id);
  }

  /** A case as stored; for the modules that work on it. */
  async find(id: number): Promise<Case> {
    const found = await this.cases.findByPk(id, { include: [...WITH_PEOPLE, ConfirmedFault] });
    if (!found) throw notFound('This case');
    return found;
  }

  /** Whether a person has read the cautions of a case. */
  async hasAcknowledged(caseId: number, personId: number): Promise<boolean> {
    return (await this.cautions.count({ where: { caseId, personId } })) > 0;
  }

  private async present(actor: Person, found: Case): Promise<CaseDto> {
    const counts = await this.countReadings([found.id]);
    return presentCase(
      found,
      actor,
      counts.get(found.id) ?? 0,
      await this.hasAcknowledged(found.id, actor.id),
    );
  }

  private async countReadings(ids: number[]): Promise<Map<number, number>> {
    const rows = (await this.readings.count({
      where: { caseId: ids, replacedAt: null, withdrawnAt: null },
      group: ['case_id'],
    })) as unknown as { case_id: number; count: number }[];
    return new Map(rows.map(({ case_id, count }) => [case_id, count]));
  }

  private async circuitFor({ familyId, netlist }: OpenCaseDto) {
    if (netlist !== undefined)
      return { netlist: soundNetlist(netlist), familyId: null, familyVersion: null };
    if (familyId === undefined) {
      throw badField('/familyId', 'Choose a chassis family, or bring a netlist.');
    }
    const newest = await this.families.newest(familyId);
    if (!newest) throw badField('/familyId', 'This family was not found. Choose another one.');
    return { netlist: newest.netlist, familyId, familyVersion: newest.version };
  }

  /** The next number of the year. */
  private async nextNumber(transaction: Transaction): Promise<string> {
    const year = new Date().getFullYear();
    const last = await this.cases.findOne({
      where: { number: { [Op.like]: `${year}-%` } },
      order: [['number', 'DESC']],
      transaction,
    });
    const count = last ? Number(last.number.split('-')[1]) : 0;
    return `${year}-${String(count + 1).padStart(4, '0')}`;
  }
}

function checkFault(netlist: Netlist, { part, mode }: ConfirmFaultDto, i: number): void {
  const found = netlist.parts.find(({ ref }) => ref === part);
  if (!found)
    throw badField(`/confirmedFaults/${i}/part`, `There is no part ${part} in this circuit.`);
  if (!modesOf(found).includes(mode)) {
    throw badField(
      `/confirmedFaults/${i}/mode`,
      `A ${found.kind} such as ${part} cannot fail in this way.`,
    );
  }
}
