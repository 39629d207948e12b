import { NetlistError } from '../errors';
import { FIELDS, fieldProblem, swappedField } from './fields';
import { readNetlist } from './read';
import { isObject } from './reader';
import type { AsFound, Netlist, NetlistProblem, Part } from './types';

/** Fields that a part of another type brings along. */
const FITTED_FIELDS = [
  'volts',
  'amps',
  'tube',
  'lamp',
  'coldRatio',
  'exponent',
  'make',
  'dropVolts',
  'ohms',
];
/** A bridged part: a wire in its place. A missing one: nothing but insulation. */
const BRIDGED_OHMS = 0.01;
const MISSING_OHMS = 1e9;

type Change = AsFound & Record<string, unknown>;

function problem(code: string, path: string, message: string, part?: string): NetlistProblem {
  return { code, path, message, ...(part ? { part } : {}) };
}

/** The part with some fields replaced, or what is wrong with them. */
function withFields(
  part: Part,
  change: Change,
  allowed: readonly string[],
  path: string,
): { part: Part; problems: NetlistProblem[] } {
  const problems: NetlistProblem[] = [];
  const fields: Record<string, unknown> = {};
  for (const [name, value] of Object.entries(change)) {
    if (['part', 'change', 'note'].includes(name)) continue;
    const rule = FIELDS[part.kind][name];
    if (!rule || !allowed.includes(name)) {
      problems.push(
        problem(
          'unknown-field',
          `${path}/${name}`,
          `${part.ref} is a ${part.kind}; “${name}” cannot be changed on it.`,
          part.ref,
        ),
      );
      continue;
    }
    const wrong = fieldProblem(name, rule, value);
    if (wrong)
      problems.push(problem('bad-value', `${path}/${name}`, `${part.ref}: ${wrong}`, part.ref));
    fields[name] = value;
  }
  const odd = swappedField(part.kind, { ...part, ...fields });
  if (odd) {
    problems.push(
      problem('bad-value', `${path}/${odd.field}`, `${part.ref}: ${odd.message}`, part.ref),
    );
  }
  if (Object.keys(fields).length === 0 && problems.length === 0) {
    problems.push(
      problem(
        'nothing-changed',
        path,
        `Say what ${part.ref} has now: no value was given.`,
        part.ref,
      ),
    );
  }
  return { part: { ...part, ...fields } as Part, problems };
}

function asJoint(part: Part, ohms: number): Part {
  const { ref, between, assembly } = part;
  return { ref, kind: 'joint', between, ohms, ...(assembly ? { assembly } : {}) };
}

/**
 * Applies what a set has that its family's drawing has not. A bridged part becomes a wire of 0.01 Ω,
 * a missing one 1 GΩ of nothing, under the same reference.
 *
 * @returns a new netlist; the family's is left as it is.
 * @throws NetlistError naming the part and the place in the list.
 */
export function applyAsFound(netlist: Netlist, asFound: readonly AsFound[]): Netlist {
  if (asFound.length === 0) return netlist;
  const parts = netlist.parts.slice();
  const problems: NetlistProblem[] = [];
  const changed = new Set<string>();
  asFound.forEach((entry, i) => {
    const path = `/asFound/${i}`;
    if (!isObject(entry)) {
      problems.push(problem('bad-change', path, 'Each thing found must be an object.'));
      return;
    }
    const change = entry as Change;
    if (change.change === 'added') {
      const added = change.add as Part | undefined;
      try {
        readNetlist({
          ...netlist,
          parts: [added],
          points: undefined,
          layout: undefined,
          line: undefined,
        });
      } catch (error) {
        if (!(error instanceof NetlistError)) throw error;
        problems.push(
          ...error.problems.map((item) => ({
            ...item,
            path: `${path}/add${(item.path ?? '').replace('/parts/0', '')}`,
          })),
        );
        return;
      }
      if (parts.some(({ ref }) => ref === added!.ref)) {
        problems.push(
          problem(
            'duplicate-ref',
            `${path}/add/ref`,
            `There is a part ${added!.ref} already. Give the added one another reference.`,
            added!.ref,
          ),
        );
        return;
      }
      parts.push(added!);
      return;
    }
    const ref = change.part as string;
    const index = parts.findIndex((part) => part.ref === ref);
    if (index < 0) {
      problems.push(
        problem(
          'unknown-part',
          `${path}/part`,
          `There is no part ${String(ref)} in this circuit.`,
          ref,
        ),
      );
      return;
    }
    if (changed.has(ref)) {
      problems.push(
        problem(
          'changed-twice',
          `${path}/part`,
          `${ref} is listed twice in what was found. Put it into one entry.`,
          ref,
        ),
      );
      return;
    }
    changed.add(ref);
    switch (change.change) {
      case 'bridged':
        parts[index] = asJoint(parts[index], BRIDGED_OHMS);
        break;
      case 'missing':
        parts[index] = asJoint(parts[index], MISSING_OHMS);
        break;
      case 'fitted':
      case 'value': {
        const allowed =
          change.change === 'fitted'
            ? FITTED_FIELDS
            : Object.entries(FIELDS[parts[index].kind])
                .filter(([, rule]) => rule.type !== 'text' && rule.type !== 'node')
                .map(([name]) => name);
        const result = withFields(parts[index], change, allowed, path);
        problems.push(...result.problems);
        parts[index] = result.part;
        break;
      }
      default:
        problems.push(
          problem(
            'unknown-change',
            `${path}/change`,
            'What was found must be fitted, value, bridged, missing or added.',
            ref,
          ),
        );
    }
  });
  if (problems.length > 0) throw new NetlistError(problems);
  return { ...netlist, parts };
}
