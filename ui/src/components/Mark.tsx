interface MarkProps {
  /** Side in px. */
  size?: number;
}

/** Our mark: a house whose roof is drawn like a resistor. Decoration, the name stands beside it. */
export function Mark({ size = 28 }: MarkProps) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 48 48"
      fill="none"
      stroke="currentColor"
      strokeWidth="3.4"
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
    >
      <path d="M3 25h4.5L12 15l6 15 6-21 6 21 6-15 4.5 10H45" />
      <path d="M11 33v10h26V33" />
      <circle cx="24" cy="38" r="2.2" fill="currentColor" stroke="none" />
    </svg>
  );
}
