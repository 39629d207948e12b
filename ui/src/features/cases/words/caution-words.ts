import { type Netlist } from '@engine/netlist/types';

export interface Caution {
  title: string;
  text: string;
}

const HOT_CHASSIS: Caution = {
  title: 'The chassis may be live.',
  text: 'In a set without a power transformer the chassis is joined to one side of the line, whichever way the plug goes in. Feed the set from an isolation transformer before you connect a meter or any other instrument.',
};

const ISOLATION: Caution = {
  title: 'Isolation is not protection from everything.',
  text: 'Behind an isolation transformer two points of the set can still give a dangerous shock. Keep one hand away from the chassis, and clip the black lead before you switch on.',
};

const CAPACITORS: Caution = {
  title: 'Capacitors stay charged.',
  text: 'Filter capacitors hold a dangerous charge after the set is unplugged, sometimes for hours. Discharge each section through a resistor, and measure that it is gone before you touch anything.',
};

const PICTURE_TUBE: Caution = {
  title: 'Picture tubes hold a charge and can implode.',
  text: 'The anode of a picture tube can stay at many thousand volts after the set is off. Discharge it as its maker says. Wear eye protection, and never lift a tube by its neck.',
};

const HOT_PARTS: Caution = {
  title: 'Tubes and droppers burn.',
  text: 'A dropper, a ballast or an output tube is hot enough to burn long after the set is off. Let the set cool before you unsolder or lift a part.',
};

/** The rule above all of ours. */
export const CODES_FIRST =
  'These cautions do not take the place of training. Local codes come first, and work on live equipment belongs to people who are trained and, where the law says so, licensed for it. If you are not, take the cold readings and ask somebody who is.';

/**
 * Collects the cautions that belong to a circuit.
 *
 * @param netlist circuit of the set.
 * @param set what the set is called; a television is told from its name.
 * @returns cautions, most pressing first. The picture tube is left out only when the set is known to be none.
 */
export function cautionsFor(netlist: Netlist, set: string): Caution[] {
  const isLineFed = !!netlist.line && !netlist.parts.some(({ kind }) => kind === 'winding');
  const mayHavePicture = !/radio|amplifier|organ|phonograph/i.test(set);
  return [
    ...(isLineFed ? [HOT_CHASSIS] : []),
    ISOLATION,
    CAPACITORS,
    ...(mayHavePicture ? [PICTURE_TUBE] : []),
    HOT_PARTS,
  ];
}
