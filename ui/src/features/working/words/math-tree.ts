/** An expression read from its text, for display only. */
export type MathNode =
  | { kind: 'number' | 'name'; text: string }
  | { kind: 'operator'; operator: string; left: MathNode; right: MathNode }
  | { kind: 'minus'; of: MathNode }
  | { kind: 'fraction'; over: MathNode; under: MathNode }
  | { kind: 'power'; base: MathNode; exponent: MathNode }
  | { kind: 'call'; name: string; of: MathNode };

/**
 * Reads an equation written as text, such as `(v1 - v2)/12.1 = v2/22`, for display.
 *
 * Knows numbers, names, `+ - * / ^ =`, brackets and functions of one argument; nothing is evaluated.
 *
 * @returns the expression, or null when the text holds anything else; the text is then shown as it is.
 */
export function toMathTree(text: string): MathNode | null {
  const tokens = tokenise(text);
  if (!tokens) return null;
  const reader = new Reader(tokens);
  try {
    const tree = reader.equation();
    return reader.isAtEnd() ? tree : null;
  } catch {
    return null;
  }
}

const TOKEN = /\s*(\d+(?:\.\d+)?(?:e[+-]?\d+)?|[A-Za-z_][\w.]*|[-+*/^=()−·≈])/iy;

function tokenise(text: string): string[] | null {
  const tokens: string[] = [];
  TOKEN.lastIndex = 0;
  while (TOKEN.lastIndex < text.trimEnd().length) {
    const match = TOKEN.exec(text);
    if (!match) return null;
    tokens.push(match[1].replace('−', '-').replace('·', '*'));
  }
  return tokens.length > 0 ? tokens : null;
}

class Reader {
  private position = 0;

  constructor(private readonly tokens: readonly string[]) {}

  isAtEnd(): boolean {
    return this.position >= this.tokens.length;
  }

  equation(): MathNode {
    let left = this.sum();
    while (this.isNext('=', '≈')) {
      const operator = this.take();
      left = { kind: 'operator', operator, left, right: this.sum() };
    }
    return left;
  }

  private sum(): MathNode {
    let left = this.product();
    while (this.isNext('+', '-')) {
      const operator = this.take();
      left = { kind: 'operator', operator, left, right: this.product() };
    }
    return left;
  }

  private product(): MathNode {
    let left = this.signed();
    while (this.isNext('*', '/')) {
      const operator = this.take();
      const right = this.signed();
      left =
        operator === '/'
          ? { kind: 'fraction', over: left, under: right }
          : { kind: 'operator', operator, left, right };
    }
    return left;
  }

  private signed(): MathNode {
    if (!this.isNext('-')) return this.power();
    this.take();
    return { kind: 'minus', of: this.signed() };
  }

  private power(): MathNode {
    const base = this.atom();
    if (!this.isNext('^')) return base;
    this.take();
    return { kind: 'power', base, exponent: this.signed() };
  }

  private atom(): MathNode {
    if (this.isAtEnd()) throw new SyntaxError('The text ends too early.');
    const token = this.take();
    if (token === '(') return this.closed();
    if (/^\d/.test(token)) return { kind: 'number', text: token };
    if (!/^[A-Za-z_]/.test(token)) throw new SyntaxError(`Unexpected ${token}`);
    if (!this.isNext('(')) return { kind: 'name', text: token };
    this.take();
    return { kind: 'call', name: token, of: this.closed() };
  }

  private closed(): MathNode {
    const inner = this.sum();
    if (!this.isNext(')')) throw new SyntaxError('A bracket is not closed.');
    this.take();
    return inner;
  }

  private isNext(...tokens: string[]): boolean {
    return tokens.includes(this.tokens[this.position]);
  }

  private take(): string {
    return this.tokens[this.position++];
  }
}
