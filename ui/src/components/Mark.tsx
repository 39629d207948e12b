interface MarkProps {
  /** Side in px. */
  size?: number;
}

/** Our mark: the sign of the ohm under a roof. Decoration, the name stands beside it. */
export function Mark({ size = 28 }: MarkProps) {
  return (
    <svg
      width={size}
      height={size}
      viewBox="0 0 48 48"
      fill="none"
      stroke="currentColor"
      strokeWidth="3.6"
      strokeLinecap="round"
      strokeLinejoin="round"
      aria-hidden="true"
    >
      <path d="M4 22 24 6l20 16" />
      <path d="M9 42h10c-4.5-3.5-7-7.5-7-12a12 12 0 0 1 24 0c0 4.5-2.5 8.5-7 12h10" />
    </svg>
  );
}
