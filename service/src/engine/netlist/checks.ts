import { islandProblems, sourceLoops } from './islands';
import type { Netlist, NetlistProblem, Part } from './types';

function partsAt(netlist: Netlist): Map<string, Part[]> {
  const at = new Map<string, Part[]>();
  for (const part of netlist.parts) {
    for (const node of new Set(part.between)) at.set(node, [...(at.get(node) ?? []), part]);
  }
  return at;
}

function duplicateRefs(netlist: Netlist): NetlistProblem[] {
  const seen = new Set<string>();
  const problems: NetlistProblem[] = [];
  netlist.parts.forEach(({ ref }, i) => {
    if (seen.has(ref)) {
      problems.push({
        code: 'duplicate-ref',
        part: ref,
        path: `/parts/${i}/ref`,
        message: `Two parts are called ${ref}. Give each part a reference of its own.`,
      });
    }
    seen.add(ref);
  });
  return problems;
}

function selfLoops(netlist: Netlist): NetlistProblem[] {
  return netlist.parts.flatMap(({ ref, between: [a, b] }, i) =>
    a === b
      ? [
          {
            code: 'both-ends-on-one-node',
            part: ref,
            nodes: [a],
            path: `/parts/${i}/between`,
            message: `Both ends of ${ref} are on node ${a}. Connect one of them elsewhere.`,
          },
        ]
      : [],
  );
}

function lineProblems(netlist: Netlist, at: Map<string, Part[]>): NetlistProblem[] {
  const { line } = netlist;
  if (!line) {
    const hasSource = netlist.parts.some(({ kind }) => kind === 'winding');
    return hasSource
      ? []
      : [
          {
            code: 'no-source',
            path: '/line',
            message:
              'The circuit has neither a line nor a transformer winding, so nothing would flow. Add the line.',
          },
        ];
  }
  if (line.hot === line.return) {
    return [
      {
        code: 'line-on-one-node',
        nodes: [line.hot],
        path: '/line/return',
        message: `Both sides of the line are on node ${line.hot}. The return must be another node.`,
      },
    ];
  }
  return (['hot', 'return'] as const).flatMap((side) =>
    at.has(line[side]) || line[side] === netlist.reference
      ? []
      : [
          {
            code: 'line-not-connected',
            nodes: [line[side]],
            path: `/line/${side}`,
            message: `The line’s ${side === 'hot' ? 'hot side' : 'return'} is on node ${line[side]}, but no part is connected there.`,
          },
        ],
  );
}

function pointProblems(netlist: Netlist, at: Map<string, Part[]>): NetlistProblem[] {
  const isThere = (node: string) =>
    at.has(node) ||
    node === netlist.reference ||
    node === netlist.line?.hot ||
    node === netlist.line?.return;
  const problems: NetlistProblem[] = [];
  const seen = new Set<string>();
  (netlist.points ?? []).forEach(({ node, label }, i) => {
    if (!isThere(node)) {
      problems.push({
        code: 'point-nowhere',
        nodes: [node],
        path: `/points/${i}/node`,
        message: `The point “${label}” is on node ${node}, but no part is connected there.`,
      });
    }
    if (seen.has(node)) {
      problems.push({
        code: 'duplicate-point',
        nodes: [node],
        path: `/points/${i}/node`,
        message: `Node ${node} is listed twice among the points. Keep one of them.`,
      });
    }
    seen.add(node);
  });
  netlist.parts.forEach((part, i) => {
    if (part.kind !== 'heater' || part.cathode === undefined || isThere(part.cathode)) return;
    problems.push({
      code: 'cathode-nowhere',
      part: part.ref,
      nodes: [part.cathode],
      path: `/parts/${i}/cathode`,
      message: `The cathode of ${part.ref} is on node ${part.cathode}, but no part is connected there.`,
    });
  });
  for (const ref of Object.keys(netlist.layout ?? {})) {
    if (netlist.parts.some((part) => part.ref === ref)) continue;
    problems.push({
      code: 'layout-of-unknown-part',
      part: ref,
      path: `/layout/${ref}`,
      message: `The layout places ${ref}, but there is no such part.`,
    });
  }
  return problems;
}

/** Kinds that do nothing at all with one end free; a spare resistor or tap end may stand in a drawing. */
const NEVER_FREE = new Set<Part['kind']>(['heater', 'lamp', 'thermistor']);

/** Heaters and lamps with an end that leads nowhere: most often two spellings of one node. */
function danglingEnds(netlist: Netlist, at: Map<string, Part[]>): NetlistProblem[] {
  const { line, reference } = netlist;
  const tied = new Set([reference, line?.hot, line?.return]);
  for (const part of netlist.parts) if (part.kind === 'heater') tied.add(part.cathode);
  return netlist.parts.flatMap((part, i) => {
    if (!NEVER_FREE.has(part.kind) || part.between[0] === part.between[1]) return [];
    return part.between.flatMap((node, end) => {
      if (tied.has(node) || at.get(node)!.length > 1) return [];
      const twin = [...at.keys()].find(
        (other) => other !== node && other.toLowerCase() === node.toLowerCase(),
      );
      const hint = twin === undefined ? 'Connect it.' : `Is it the same as node ${twin}?`;
      return [
        {
          code: 'dangling-node',
          part: part.ref,
          nodes: [node],
          path: `/parts/${i}/between/${end}`,
          message: `Only ${part.ref} is connected at node ${node}, so no current can flow. ${hint}`,
        },
      ];
    });
  });
}

/** Rectifiers with nothing to feed: their steady state says nothing about a set. */
function loadProblems(netlist: Netlist): NetlistProblem[] {
  const rectifiers = netlist.parts.filter(({ kind }) => kind === 'rectifier');
  if (rectifiers.length === 0) return [];
  const isConsumer = netlist.parts.some(
    ({ kind }) => kind === 'load' || kind === 'resistor' || kind === 'heater',
  );
  return isConsumer
    ? []
    : [
        {
          code: 'rectifier-without-load',
          part: rectifiers[0].ref,
          message: `${rectifiers[0].ref} rectifies, but nothing draws current. Add the load that the rail feeds.`,
        },
      ];
}

/**
 * Checks whether a netlist makes sense as a circuit. Pure; the ui shows the same problems live.
 *
 * @param netlist a document that `readNetlist` has accepted.
 * @returns every problem, naming its part and nodes; empty when the circuit can be solved.
 */
export function checkNetlist(netlist: Netlist): NetlistProblem[] {
  const at = partsAt(netlist);
  return [
    ...duplicateRefs(netlist),
    ...selfLoops(netlist),
    ...lineProblems(netlist, at),
    ...islandProblems(netlist, at),
    ...danglingEnds(netlist, at),
    ...sourceLoops(netlist),
    ...pointProblems(netlist, at),
    ...loadProblems(netlist),
  ];
}
