import { type BranchElement, LIMITS } from './elements';
import { solvedEsr, sourcePeak, type Topology } from './topology';

/**
 * How every element answers the voltage across it: i = siemens·v + own·state + sine·sin ωt + steady.
 * Rectifiers are given as conducting; blocked ones have `blockedSiemens` and nothing else.
 */
export interface BranchLaws {
  siemens: Float64Array;
  own: Float64Array;
  sine: Float64Array;
  steady: Float64Array;
  blockedSiemens: Float64Array;
}

/** Share of a choke's terminal voltage and current that its loss resistance leaves to the winding. */
export function chokeShare(
  element: { henries: number; ohms: number },
  omega: number,
): { share: number; siemens: number } {
  const loss = LIMITS.chokeLoss * omega * Math.max(element.henries, 1e-9);
  const ohms = Math.max(element.ohms, 0);
  return { share: loss / (loss + ohms), siemens: 1 / (loss + ohms) };
}

/** Conductance of an element; slow ones get theirs from the cycle. */
function fixedSiemens(element: BranchElement, omega: number): number {
  switch (element.kind) {
    case 'resistance':
      return 1 / Math.max(element.ohms, LIMITS.leastOhms);
    case 'capacitor':
      return 1 / solvedEsr(element.farads, element.esr, omega);
    case 'inductor':
      return chokeShare(element, omega).siemens;
    case 'rectifier':
      return 1 / Math.max(element.ohms, LIMITS.leastRectifierOhms);
    case 'source':
      return 1 / Math.max(element.ohms, LIMITS.leastRectifierOhms);
    case 'load':
      return element.amps / element.volts;
    default:
      return 0;
  }
}

/** Laws of all elements of a block; the conductances of slow ones are filled in later. */
export function branchLaws(block: Topology): BranchLaws {
  const size = block.elements.length;
  const laws: BranchLaws = {
    siemens: new Float64Array(size),
    own: new Float64Array(size),
    sine: new Float64Array(size),
    steady: new Float64Array(size),
    blockedSiemens: new Float64Array(size),
  };
  block.elements.forEach((element, k) => {
    if (block.isIdeal[k]) return;
    const siemens = fixedSiemens(element, block.omega);
    laws.siemens[k] = siemens;
    if (element.kind === 'capacitor') laws.own[k] = -siemens;
    else if (element.kind === 'inductor') laws.own[k] = chokeShare(element, block.omega).share;
    else if (element.kind === 'source') laws.sine[k] = -siemens * sourcePeak(element);
    else if (element.kind === 'rectifier') {
      laws.steady[k] = -siemens * element.dropVolts;
      laws.blockedSiemens[k] = element.reverseOhms
        ? 1 / element.reverseOhms
        : LIMITS.blockedSiemens;
    }
  });
  return laws;
}
