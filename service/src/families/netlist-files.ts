import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import { EngineError, readNetlist, requireSound } from '../engine';
import type { FamilyFile } from './families.service';
import { SET_KINDS, type SetKind } from './family.model';

/** Files beside the netlists that are not netlists themselves. */
const NOT_NETLISTS = new Set(['netlist.schema.json', 'families.json']);

/** A file that was refused, and why. */
export interface RefusedFile {
  file: string;
  reason: string;
}

/** What families.json says of one file. */
interface FamilyEntry {
  name?: string;
  kind?: string;
  tags?: string[];
  description?: string;
}

function reasonOf(error: unknown): string {
  if (error instanceof EngineError) return error.message;
  return error instanceof SyntaxError ? `It is not valid JSON: ${error.message}.` : String(error);
}

/**
 * Reads the netlists of a folder, each with its entry in families.json. A broken file is left out
 * and told by name; the others are taken.
 */
export function readNetlistFiles(folder: string): { files: FamilyFile[]; refused: RefusedFile[] } {
  const files: FamilyFile[] = [];
  const refused: RefusedFile[] = [];
  let entries: Record<string, FamilyEntry> = {};
  try {
    entries = JSON.parse(readFileSync(join(folder, 'families.json'), 'utf8')) as typeof entries;
  } catch (error) {
    refused.push({ file: 'families.json', reason: reasonOf(error) });
  }
  const names = readdirSync(folder).filter(
    (name) => name.endsWith('.json') && !NOT_NETLISTS.has(name),
  );
  for (const file of names.sort()) {
    try {
      const netlist = readNetlist(JSON.parse(readFileSync(join(folder, file), 'utf8')));
      requireSound(netlist, []);
      const entry = entries[file] ?? {};
      const kind = SET_KINDS.includes(entry.kind as SetKind) ? (entry.kind as SetKind) : 'other';
      files.push({
        slug: file.replace(/\.json$/, ''),
        name: entry.name ?? netlist.title,
        kind,
        tags: entry.tags ?? [],
        description: entry.description ?? '',
        netlist,
      });
    } catch (error) {
      refused.push({ file, reason: reasonOf(error) });
    }
  }
  return { files, refused };
}
