import { type MathNode } from '../words/math-tree';

/** How tightly an operator binds; weaker ones get brackets inside stronger ones. */
const STRENGTH: Record<string, number> = { '=': 0, '≈': 0, '+': 1, '-': 1, '*': 2 };

/** MathML of an expression. */
export function MathTree({ tree }: { tree: MathNode }) {
  switch (tree.kind) {
    case 'number':
      return <mn>{tree.text}</mn>;
    case 'name':
      return <Name text={tree.text} />;
    case 'minus':
      return (
        <mrow>
          <mo>−</mo>
          <Bracketed tree={tree.of} within={2} />
        </mrow>
      );
    case 'fraction':
      return (
        <mfrac>
          <mrow>
            <MathTree tree={tree.over} />
          </mrow>
          <mrow>
            <MathTree tree={tree.under} />
          </mrow>
        </mfrac>
      );
    case 'power':
      return (
        <msup>
          <Bracketed tree={tree.base} within={3} />
          <mrow>
            <MathTree tree={tree.exponent} />
          </mrow>
        </msup>
      );
    case 'call':
      return (
        <mrow>
          <mi>{tree.name}</mi>
          <mo>(</mo>
          <MathTree tree={tree.of} />
          <mo>)</mo>
        </mrow>
      );
    case 'operator': {
      const strength = STRENGTH[tree.operator];
      const sign = tree.operator === '*' ? '·' : tree.operator === '-' ? '−' : tree.operator;
      return (
        <mrow>
          <Bracketed tree={tree.left} within={strength} />
          <mo>{sign}</mo>
          <Bracketed tree={tree.right} within={tree.operator === '-' ? strength + 1 : strength} />
        </mrow>
      );
    }
  }
}

function Bracketed({ tree, within }: { tree: MathNode; within: number }) {
  const strength =
    tree.kind === 'operator' ? STRENGTH[tree.operator] : tree.kind === 'minus' ? 1 : 9;
  if (strength >= within) return <MathTree tree={tree} />;
  return (
    <mrow>
      <mo>(</mo>
      <MathTree tree={tree} />
      <mo>)</mo>
    </mrow>
  );
}

/** `vB2`, `v_B2` or `i_R1B`: the first letter with the rest below it. */
function Name({ text }: { text: string }) {
  const match = /^([vi])_?(\w+)$/i.exec(text);
  if (!match) return <mi>{text}</mi>;
  return (
    <msub>
      <mi>{match[1]}</mi>
      <mtext>{match[2]}</mtext>
    </msub>
  );
}
