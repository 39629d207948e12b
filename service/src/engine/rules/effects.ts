import { modesOf } from '../faults/modes';
import type { FaultMode, Netlist, Part } from '../netlist/types';
import { selectParts } from './select';
import type { PartSelector, Rule, RulesOutcome } from './types';

/** Fewer than this are no common cause: their own odds say as much. */
const LEAST_MEMBERS = 2;

/**
 * Adds a fired rule's effects to the outcome. A mode that a part cannot have is left out.
 *
 * @param netlist the circuit as found.
 * @param at the part at hand, for rules about each part or each body.
 */
export function applyEffects(
  rule: Rule,
  netlist: Netlist,
  at: Part | undefined,
  outcome: RulesOutcome,
): void {
  const { id, because } = rule;
  const meant = (selector: PartSelector, mode: FaultMode) =>
    selectParts(netlist, selector, at).filter((part) => modesOf(part).includes(mode));
  for (const effect of rule.then) {
    switch (effect.effect) {
      case 'advice':
      case 'caution': {
        const { effect: kind, text } = effect;
        // Said once, however many parts ask for it.
        if (outcome.advice.some((said) => said.rule === id && said.text === text)) break;
        outcome.advice.push({ rule: id, effect: kind, text, because });
        break;
      }
      case 'cause': {
        const { name, probability } = effect;
        const members = effect.members.flatMap((member) =>
          meant(member.parts, member.mode).map(({ ref }) => ({
            part: ref,
            mode: member.mode,
            probability: member.probability,
          })),
        );
        if (members.length < LEAST_MEMBERS) break;
        outcome.causes.push({ name, rule: id, because, probability, members });
        break;
      }
      default: {
        const { mode } = effect;
        const factor = effect.effect === 'speaks-for' ? effect.factor : 1 / effect.factor;
        for (const { ref } of meant(effect.parts, mode)) {
          outcome.factors.push({ part: ref, mode, factor, rule: id, because });
        }
      }
    }
  }
}
