import { join } from 'node:path';
import { Injectable, Logger, type OnModuleInit } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { allow, isAtLeast } from '../common/policy';
import { notFound } from '../common/problem';
import { PROJECT_ROOT } from '../config/settings';
import { DatabaseService } from '../database/database.service';
import type { Rule } from '../engine';
import { contentHash } from '../families/families.service';
import type { Person } from '../people/person.model';
import { presentRule, type RuleDto, type RuleListDto } from './dto/rule.dto';
import { type RefusedRule, readRuleFiles, type RuleFile } from './rule-files';
import { RuleRow } from './rule.model';

/** The rule book. */
@Injectable()
export class RulesService implements OnModuleInit {
  private readonly logger = new Logger(RulesService.name);
  private refused: RefusedRule[] = [];

  constructor(
    private readonly database: DatabaseService,
    @InjectModel(RuleRow) private readonly rules: typeof RuleRow,
  ) {}

  /** Takes the packs that ship with the project. */
  async onModuleInit(): Promise<void> {
    await this.takeFolder(join(PROJECT_ROOT, 'rules'));
  }

  /** Takes every pack of a folder; a broken file is refused by name and the others are taken. */
  async takeFolder(folder: string): Promise<void> {
    const { files, refused } = readRuleFiles(folder);
    this.refused = refused;
    for (const { file, reason } of refused)
      this.logger.warn(`rules/${file} was refused: ${reason}`);
    for (const file of files) await this.takeFile(file);
  }

  /** Active rules by pack and name, and the files that were refused. */
  async list(actor: Person): Promise<RuleListDto> {
    allow(isAtLeast(actor, 'trainee'), 'Sign in to see the rules.');
    const rows = await this.rules.findAll({
      where: { state: 'active' },
      order: [
        ['pack', 'ASC'],
        ['rule_key', 'ASC'],
      ],
    });
    return { rules: rows.map(presentRule), refused: this.refused };
  }

  /** One rule with its versions. */
  async get(actor: Person, key: string): Promise<RuleDto> {
    allow(isAtLeast(actor, 'trainee'), 'Sign in to see the rules.');
    const rows = await this.rules.findAll({
      where: { ruleKey: key },
      order: [['version', 'DESC']],
    });
    if (rows.length === 0) throw notFound('This rule');
    return {
      ...presentRule(rows[0]),
      content: rows[0].content,
      versions: rows.map(({ version, createdAt, state }) => ({
        version,
        at: createdAt.toISOString(),
        state,
      })),
    };
  }

  /** Rules that speak in a diagnosis. */
  async active(): Promise<Rule[]> {
    const rows = await this.rules.findAll({
      where: { state: 'active' },
      order: [['rule_key', 'ASC']],
    });
    return rows.map(({ content }) => content);
  }

  private async takeFile({ pack, rule }: RuleFile): Promise<void> {
    const hash = contentHash(rule);
    await this.database.write(async (transaction) => {
      const rows = await this.rules.findAll({
        where: { ruleKey: rule.id },
        order: [['version', 'DESC']],
        transaction,
      });
      if (rows.some(({ contentHash: known }) => known === hash)) return;
      await this.rules.update(
        { state: 'superseded' },
        { where: { ruleKey: rule.id, state: 'active' }, transaction },
      );
      await this.rules.create(
        {
          ruleKey: rule.id,
          pack,
          version: (rows[0]?.version ?? 0) + 1,
          state: 'active',
          content: rule,
          contentHash: hash,
        },
        { transaction },
      );
    });
  }
}
