import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { checkRule, type Rule } from '../engine';

/** A rule as read from a pack. */
export interface RuleFile {
  pack: string;
  rule: Rule;
}

/** A file that was refused, by name and reason. */
export interface RefusedRule {
  file: string;
  reason: string;
}

/**
 * Reads the packs of a folder: one folder a pack, one file a rule. A broken file is left out and
 * told by name; the others are taken.
 */
export function readRuleFiles(folder: string): { files: RuleFile[]; refused: RefusedRule[] } {
  const files: RuleFile[] = [];
  const refused: RefusedRule[] = [];
  const seen = new Set<string>();
  const packs = readdirSync(folder, { withFileTypes: true }).filter((entry) => entry.isDirectory());
  for (const { name: pack } of packs) {
    const names = readdirSync(join(folder, pack)).filter((name) => name.endsWith('.json'));
    for (const name of names.sort()) {
      const file = `${pack}/${name}`;
      try {
        const json: unknown = JSON.parse(readFileSync(join(folder, pack, name), 'utf8'));
        const problems = checkRule(json);
        const { id } = json as Rule;
        if (problems.length === 0 && seen.has(id)) {
          problems.push({
            code: 'duplicate-id',
            message: `Another file has a rule “${id}” already.`,
          });
        }
        if (problems.length > 0) {
          refused.push({ file, reason: problems.map(({ message }) => message).join(' ') });
          continue;
        }
        seen.add(id);
        files.push({ pack, rule: json as Rule });
      } catch (error) {
        refused.push({ file, reason: `It is not valid JSON: ${(error as Error).message}.` });
      }
    }
  }
  return { files, refused };
}
