import { formatQuantity } from '../units';
import { type Formula, numberOf, sumOf, toMathml, toTex, toText } from './formula';
import type { Equation, NodalConductance, NodalSystem } from './types';

/** Ohms and more precise than a part's printed value need not be shown. */
const OHM_FIGURES = 4;

/** Ohms of a conductance, as a formula with its unit. */
function ohmsOf(siemens: number): Formula {
  const [text, unit] = formatQuantity(1 / siemens, 'Ω', OHM_FIGURES).split(' ');
  return { kind: 'quantity', text, unit };
}

/** A node's voltage: the number when it is known. */
function voltsOf(system: NodalSystem, node: string): Formula {
  return node in system.fixed ? numberOf(system.fixed[node]) : { kind: 'volts', node };
}

/** Current from a neighbour through one part into the node. */
function currentInto(system: NodalSystem, node: string, branch: NodalConductance): Formula {
  const other = branch.a === node ? branch.b : branch.a;
  const from = voltsOf(system, other);
  const isZero = system.fixed[other] === 0;
  const here: Formula = { kind: 'volts', node };
  return {
    kind: 'fraction',
    top: isZero
      ? here
      : sumOf([
          { isMinus: false, of: from },
          { isMinus: true, of: here },
        ]),
    bottom: ohmsOf(branch.siemens),
    part: branch.part,
  };
}

/**
 * Nodal equation of one node: the currents that flow into it add up to nothing. Terms towards a
 * node at 0 V are written as −v/R.
 */
function equationOf(system: NodalSystem, node: string): Formula {
  const branches = system.conductances.filter(
    ({ a, b, siemens }) => a !== b && siemens > 0 && (a === node || b === node),
  );
  const terms = branches.map((branch) => {
    const other = branch.a === node ? branch.b : branch.a;
    return { isMinus: system.fixed[other] === 0, of: currentInto(system, node, branch) };
  });
  const amps = system.injections[node] ?? 0;
  if (amps !== 0) {
    const [text, unit] = formatQuantity(Math.abs(amps), 'A', 5).split(' ');
    terms.push({ isMinus: amps < 0, of: { kind: 'quantity', text, unit } });
  }
  // A positive term reads best in front.
  terms.sort((x, y) => Number(x.isMinus) - Number(y.isMinus));
  return { kind: 'equation', left: sumOf(terms), right: { kind: 'number', text: '0' } };
}

/** Nodal equations of all unknown nodes, for a person. */
export function equationsOf(system: NodalSystem): Equation[] {
  return system.nodes
    .filter((node) => !(node in system.fixed))
    .map((node) => {
      const formula = equationOf(system, node);
      return { node, text: toText(formula), tex: toTex(formula), mathml: toMathml(formula) };
    });
}

/** What a person should know about single terms: each part's note once. */
export function notesOf(system: NodalSystem): string[] {
  const notes = new Set<string>();
  for (const { part, note, siemens } of system.conductances) {
    if (note) notes.add(`${part} (${formatQuantity(1 / siemens, 'Ω', OHM_FIGURES)}): ${note}`);
  }
  return [...notes];
}
