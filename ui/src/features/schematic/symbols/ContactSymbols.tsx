/** Switch, drawn open as it rests. */
export function SwitchSymbol() {
  return (
    <>
      <path d="M-30 0H-14M14 0H30M-11-2L13-13" />
      <circle cx={-12} r={2.5} />
      <circle cx={12} r={2.5} />
    </>
  );
}

/** Fuse. */
export function FuseSymbol() {
  return (
    <>
      <rect x={-17} y={-7} width={34} height={14} rx={2} />
      <path d="M-30 0H30" />
    </>
  );
}

/** Soldered or screwed joint that may be poor. */
export function JointSymbol() {
  return (
    <>
      <path d="M-30 0H-5M5 0H30" />
      <circle r={5} />
    </>
  );
}
