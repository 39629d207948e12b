/** Heater in its tube's envelope; the cathode is drawn where it leads to a node of its own. */
export function HeaterSymbol({ hasCathode }: { hasCathode: boolean }) {
  return (
    <>
      <circle r={24} strokeWidth={1.4} />
      <path d="M-30 0H-11L0 11L11 0H30" />
      {hasCathode && <path d="M-9 13V15.500H9V13M0 15.500V24" />}
    </>
  );
}

/** Incandescent lamp. */
export function LampSymbol() {
  return (
    <>
      <circle r={16} />
      <path d="M-30 0H-16M16 0H30M-11.300-11.300L11.300 11.300M-11.300 11.300L11.300-11.300" />
    </>
  );
}

/** Vacuum rectifier: plate first, cathode second. */
export function VacuumRectifierSymbol() {
  return (
    <>
      <circle r={18} strokeWidth={1.4} />
      <path d="M-30 0H-6M-6-10V10M30 0H8M5-9Q8-9 8-6V6Q8 9 5 9" />
    </>
  );
}

/** Dry rectifier: selenium stack outlined, silicon filled. */
export function DryRectifierSymbol({ isFilled }: { isFilled: boolean }) {
  return (
    <>
      <path d="M-30 0H-11M11 0H30M11-12V12" />
      <path d="M-11-12V12L11 0Z" fill={isFilled ? 'currentColor' : 'none'} />
    </>
  );
}
