import { type HTMLAttributes } from 'react';

// React renders MathML but does not declare its elements.
declare module 'react' {
  // eslint-disable-next-line @typescript-eslint/no-namespace
  namespace JSX {
    interface IntrinsicElements {
      math: HTMLAttributes<MathMLElement>;
      mrow: HTMLAttributes<MathMLElement>;
      mi: HTMLAttributes<MathMLElement>;
      mn: HTMLAttributes<MathMLElement>;
      mo: HTMLAttributes<MathMLElement>;
      mtext: HTMLAttributes<MathMLElement>;
      mfrac: HTMLAttributes<MathMLElement>;
      msup: HTMLAttributes<MathMLElement>;
      msub: HTMLAttributes<MathMLElement>;
    }
  }
}
