import { type HTMLAttributes } from 'react';

// React renders MathML but does not declare its elements.
declare module 'react' {
  namespace JSX {
    interface IntrinsicElements {
      math: HTMLAttributes<MathMLElement> & { displaystyle?: 'true' | 'false' };
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
