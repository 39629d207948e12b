import { type Part } from '@engine/netlist/types';
import { type Turn } from '../geometry/drawing';
import { FuseSymbol, JointSymbol, SwitchSymbol } from './ContactSymbols';
import {
  CapacitorSymbol,
  ChokeSymbol,
  ResistorSymbol,
  ThermistorSymbol,
  WindingSymbol,
} from './PassiveSymbols';
import { LoadSymbol } from './SupplySymbols';
import { DryRectifierSymbol, HeaterSymbol, LampSymbol, VacuumRectifierSymbol } from './TubeSymbols';

interface PartSymbolProps {
  part: Part;
  turn?: Turn;
  /** Node that readings are taken against: a heater's cathode there is not drawn. */
  reference: string;
}

const TURNS: Record<Turn, string> = {
  0: '',
  1: 'rotate(90)',
  2: 'scale(-1 1)',
  3: 'rotate(90) scale(-1 1)',
};

/**
 * Graphical symbol of a part about its centre, terminals 30 to either side, in the current colour.
 *
 * Drawn for Ohmstead after the conventions of IEC 60617 and IEEE 315.
 */
export function PartSymbol({ part, turn = 0, reference }: PartSymbolProps) {
  return (
    <g transform={TURNS[turn]} fill="none" stroke="currentColor">
      <Symbol part={part} reference={reference} />
    </g>
  );
}

function Symbol({ part, reference }: { part: Part; reference: string }) {
  switch (part.kind) {
    case 'resistor':
      return <ResistorSymbol />;
    case 'heater':
      return <HeaterSymbol hasCathode={!!part.cathode && part.cathode !== reference} />;
    case 'lamp':
      return <LampSymbol />;
    case 'thermistor':
      return <ThermistorSymbol />;
    case 'switch':
      return <SwitchSymbol />;
    case 'fuse':
      return <FuseSymbol />;
    case 'joint':
      return <JointSymbol />;
    case 'capacitor':
      return (
        <CapacitorSymbol
          isPolarised={part.make === 'electrolytic'}
          isPositiveFirst={part.between[0] !== reference}
        />
      );
    case 'rectifier':
      return part.make === 'vacuum' || part.make === undefined ? (
        <VacuumRectifierSymbol />
      ) : (
        <DryRectifierSymbol isFilled={part.make === 'silicon'} />
      );
    case 'choke':
      return <ChokeSymbol />;
    case 'winding':
      return <WindingSymbol isOpposed={part.phase === 180} />;
    case 'load':
      return <LoadSymbol />;
  }
}
