/** A quantity between two instants a length apart, known with its slopes: a Hermite cubic. */
export interface Span {
  length: number;
  from: number;
  fromSlope: number;
  to: number;
  toSlope: number;
}

/** Value of the cubic at a fraction of the span. */
export function cubicAt(span: Span, s: number): number {
  const { length, from, fromSlope, to, toSlope } = span;
  const r = 1 - s;
  return (
    r * r * ((1 + 2 * s) * from + s * length * fromSlope) +
    s * s * ((1 + 2 * r) * to - r * length * toSlope)
  );
}

/** Fraction of the span where the cubic passes zero; its ends must differ in sign. */
export function cubicZero(span: Span): number {
  let low = 0;
  let high = 1;
  let s = span.from / (span.from - span.to);
  for (let i = 0; i < 40; i += 1) {
    const value = cubicAt(span, s);
    if (value > 0 === span.to > 0) high = s;
    else low = s;
    const slope = cubicSlope(span, s);
    let next = s - value / slope;
    if (!(next > low && next < high)) next = (low + high) / 2;
    if (Math.abs(next - s) < 1e-12) return next;
    s = next;
  }
  return s;
}

/** Fraction of the span where the cubic turns; its end slopes must differ in sign. */
export function cubicTurn(span: Span): number {
  // Slope is a quadratic a·s² + b·s + c in the fraction s.
  const { length, from, fromSlope, to, toSlope } = span;
  const m0 = fromSlope * length;
  const m1 = toSlope * length;
  const a = 6 * (from - to) + 3 * (m0 + m1);
  const b = 6 * (to - from) - 4 * m0 - 2 * m1;
  const c = m0;
  const root = Math.sqrt(Math.max(b * b - 4 * a * c, 0));
  // The stable form of both roots; one of them lies inside the span.
  const q = -0.5 * (b + (b < 0 ? -root : root));
  const first = c === 0 ? 0 : c / q;
  const second = a === 0 ? first : q / a;
  const isInside = (s: number) => s >= 0 && s <= 1;
  return isInside(first) ? first : isInside(second) ? second : 0.5;
}

function cubicSlope(span: Span, s: number): number {
  const { length, from, fromSlope, to, toSlope } = span;
  const r = 1 - s;
  return (
    6 * s * r * (to - from) + length * (fromSlope * r * (1 - 3 * s) + toSlope * s * (3 * s - 2))
  );
}
