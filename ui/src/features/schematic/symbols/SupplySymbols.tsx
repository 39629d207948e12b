import { type RailSymbol } from '../geometry/drawing';

/** Tubes and stages fed from a rail, drawn as one block. */
export function LoadSymbol() {
  return (
    <>
      <rect x={-19} y={-15} width={38} height={30} rx={3} />
      <path d="M-30 0H-19M19 0H30M-11 0H8M3-5L9 0L3 5" />
    </>
  );
}

/** The AC line, upright: hot at the top. */
export function LineSymbol() {
  return (
    <>
      <path d="M0-30V-18M0 18V30M-10 0C-7-9-3-9 0 0S7 9 10 0" />
      <circle r={18} />
    </>
  );
}

/** End of a wire on the chassis, on another reference, on a rail drawn elsewhere, or nowhere. */
export function RailEnd({ rail, isChassis }: { rail: RailSymbol; isChassis: boolean }) {
  if (rail.kind === 'loose') return <circle cy={4} r={4} />;
  if (rail.kind === 'flag') {
    const angle = rail.side === 'below' ? 0 : rail.side === 'left' ? 90 : -90;
    return <path transform={`rotate(${angle})`} d="M0 0V4M-6 4H6L0 14Z" />;
  }
  return isChassis ? (
    <path d="M0 0V6M-12 6H12M-12 6L-17 14M0 6L-5 14M12 6L7 14" />
  ) : (
    <path d="M0 0V6M-12 6H12L0 17Z" />
  );
}
