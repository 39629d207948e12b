/** A formula that can be written as plain text, TeX and presentation MathML. */
export type Formula =
  | { kind: 'number'; text: string }
  /** A number with its unit. */
  | { kind: 'quantity'; text: string; unit: string }
  /** The voltage of a node. */
  | { kind: 'volts'; node: string }
  /** A part's name standing for its ohms. */
  | { kind: 'part'; ref: string }
  | { kind: 'sum'; terms: { isMinus: boolean; of: Formula }[] }
  | { kind: 'fraction'; top: Formula; bottom: Formula; part?: string }
  | { kind: 'product'; left: Formula; right: Formula }
  | { kind: 'equation'; left: Formula; right: Formula };

const MINUS = '\u2212';

/** Shows a number to so many figures, with a typographic minus. */
export function figures(value: number, digits = 5): string {
  const rounded = Number(value.toPrecision(digits));
  const size = Math.abs(rounded);
  if (rounded !== 0 && (size >= 1e7 || size < 1e-4)) {
    return rounded.toExponential().replace('-', MINUS).replace('e+', 'e');
  }
  return String(rounded).replace('-', MINUS);
}

/** A plain number as a formula. */
export function numberOf(value: number, digits = 5): Formula {
  return { kind: 'number', text: figures(value, digits) };
}

/** Terms with their signs as one sum; a single positive term stays itself. */
export function sumOf(terms: { isMinus: boolean; of: Formula }[]): Formula {
  return terms.length === 1 && !terms[0].isMinus ? terms[0].of : { kind: 'sum', terms };
}

function isCompound(formula: Formula): boolean {
  return formula.kind === 'sum' && formula.terms.length > 1;
}

/** Plain text: `(117 − v(B3))/22 Ω [R1]`. */
export function toText(formula: Formula): string {
  switch (formula.kind) {
    case 'number':
      return formula.text;
    case 'quantity':
      return `${formula.text} ${formula.unit}`;
    case 'volts':
      return `v(${formula.node})`;
    case 'part':
      return formula.ref;
    case 'sum':
      return formula.terms
        .map(({ isMinus, of }, i) => {
          const sign = i === 0 ? (isMinus ? MINUS : '') : isMinus ? ` ${MINUS} ` : ' + ';
          return sign + (isMinus && isCompound(of) ? `(${toText(of)})` : toText(of));
        })
        .join('');
    case 'fraction': {
      const bottom = isCompound(formula.bottom)
        ? `(${toText(formula.bottom)})`
        : toText(formula.bottom);
      const top = isCompound(formula.top) ? `(${toText(formula.top)})` : toText(formula.top);
      return `${top}/${bottom}${formula.part ? ` [${formula.part}]` : ''}`;
    }
    case 'product':
      return `${toText(formula.left)}·${toText(formula.right)}`;
    case 'equation':
      return `${toText(formula.left)} = ${toText(formula.right)}`;
  }
}

/** Characters that mean something to TeX. */
function texName(name: string): string {
  return name.replace(/[\\{}$&#^_%~]/g, (sign) =>
    sign === '\\' ? '\\backslash ' : sign === '^' || sign === '~' ? `\\${sign}{}` : `\\${sign}`,
  );
}

function texNumber(text: string): string {
  const plain = text.replaceAll(MINUS, '-');
  const [mantissa, exponent] = plain.split('e');
  return exponent === undefined ? plain : `${mantissa}\\cdot 10^{${exponent}}`;
}

function texUnit(unit: string): string {
  return `\\mathrm{${unit.replace('Ω', '\\Omega ').replace('µ', '\\mu ')}}`;
}

/** TeX, without delimiters. */
export function toTex(formula: Formula): string {
  switch (formula.kind) {
    case 'number':
      return texNumber(formula.text);
    case 'quantity':
      return `${texNumber(formula.text)}\\,${texUnit(formula.unit)}`;
    case 'volts':
      return `v_{\\mathrm{${texName(formula.node)}}}`;
    case 'part':
      return `\\mathrm{${texName(formula.ref)}}`;
    case 'sum':
      return formula.terms
        .map(({ isMinus, of }, i) => {
          const sign = i === 0 ? (isMinus ? '-' : '') : isMinus ? ' - ' : ' + ';
          return sign + (isMinus && isCompound(of) ? `\\left(${toTex(of)}\\right)` : toTex(of));
        })
        .join('');
    case 'fraction': {
      const whole = `\\frac{${toTex(formula.top)}}{${toTex(formula.bottom)}}`;
      return formula.part ? `\\underbrace{${whole}}_{\\mathrm{${texName(formula.part)}}}` : whole;
    }
    case 'product':
      return `${toTex(formula.left)}\\cdot ${toTex(formula.right)}`;
    case 'equation':
      return `${toTex(formula.left)} = ${toTex(formula.right)}`;
  }
}

function escaped(text: string): string {
  return text.replace(/[&<>"]/g, (sign) => `&#${sign.charCodeAt(0)};`);
}

function mathNumber(text: string): string {
  const sign = text.startsWith(MINUS) ? `<mo>${MINUS}</mo>` : '';
  const [mantissa, exponent] = text.replace(MINUS, '').split('e');
  if (exponent === undefined) return `${sign}<mn>${mantissa}</mn>`;
  const power = exponent.startsWith(MINUS)
    ? `<mrow><mo>${MINUS}</mo><mn>${exponent.slice(1)}</mn></mrow>`
    : `<mn>${exponent}</mn>`;
  return `${sign}<mn>${mantissa}</mn><mo>·</mo><msup><mn>10</mn>${power}</msup>`;
}

function mathInner(formula: Formula): string {
  switch (formula.kind) {
    case 'number':
      return mathNumber(formula.text);
    case 'quantity':
      return `${mathNumber(formula.text)}<mtext>&#160;${escaped(formula.unit)}</mtext>`;
    case 'volts':
      return `<msub><mi>v</mi><mtext>${escaped(formula.node)}</mtext></msub>`;
    case 'part':
      return `<mtext>${escaped(formula.ref)}</mtext>`;
    case 'sum':
      return formula.terms
        .map(({ isMinus, of }, i) => {
          const sign =
            i === 0 ? (isMinus ? `<mo>${MINUS}</mo>` : '') : `<mo>${isMinus ? MINUS : '+'}</mo>`;
          const inner = mathInner(of);
          return sign + (isMinus && isCompound(of) ? `<mo>(</mo>${inner}<mo>)</mo>` : inner);
        })
        .join('');
    case 'fraction': {
      const whole = `<mfrac><mrow>${mathInner(formula.top)}</mrow><mrow>${mathInner(formula.bottom)}</mrow></mfrac>`;
      return formula.part
        ? `<munder>${whole}<mtext>${escaped(formula.part)}</mtext></munder>`
        : whole;
    }
    case 'product':
      return `${mathInner(formula.left)}<mo>·</mo>${mathInner(formula.right)}`;
    case 'equation':
      return `${mathInner(formula.left)}<mo>=</mo>${mathInner(formula.right)}`;
  }
}

/** Presentation MathML (MathML Core): one `math` element. */
export function toMathml(formula: Formula): string {
  return `<math xmlns="http://www.w3.org/1998/Math/MathML" display="block"><mrow>${mathInner(formula)}</mrow></math>`;
}
