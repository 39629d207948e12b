/** Resistor, terminals at x = −30 and 30. */
export function ResistorSymbol() {
  return <path d="M-30 0H-20l3-9 6 18 7-18 7 18 7-18 6 18 4-9H30" />;
}

/** Thermistor: a resistor with the sloping line of a dependence, its foot level. */
export function ThermistorSymbol() {
  return (
    <>
      <ResistorSymbol />
      <path d="M-24 15H-16L18-15" />
    </>
  );
}

/** Capacitor; an electrolytic one bears a plus at its positive plate. */
export function CapacitorSymbol({
  isPolarised,
  isPositiveFirst,
}: {
  isPolarised: boolean;
  isPositiveFirst: boolean;
}) {
  const side = isPositiveFirst ? 1 : -1;
  return (
    <>
      <path d="M-30 0H-4M4 0H30" />
      <g transform={`scale(${side} 1)`}>
        <path d="M-4-14V14" />
        {isPolarised ? <path d="M10-14Q-1 0 10 14M3.9 0H12" /> : <path d="M4-14V14" />}
        {isPolarised && <path d="M-15-9H-9M-12-12V-6" strokeWidth={1.4} />}
      </g>
    </>
  );
}

/** Iron-cored choke. */
export function ChokeSymbol() {
  return (
    <path d="M-30 0H-24a6 6 0 0 1 12 0a6 6 0 0 1 12 0a6 6 0 0 1 12 0a6 6 0 0 1 12 0H30M-24-10H24" />
  );
}

/** Secondary winding with the dot of its phase. */
export function WindingSymbol({ isOpposed }: { isOpposed: boolean }) {
  return (
    <>
      <path d="M-30 0H-24a6 6 0 0 1 12 0a6 6 0 0 1 12 0a6 6 0 0 1 12 0a6 6 0 0 1 12 0H30M-24-10H24M-24-13H24" />
      <circle cx={isOpposed ? 22 : -22} cy={7} r={2.2} fill="currentColor" stroke="none" />
    </>
  );
}
