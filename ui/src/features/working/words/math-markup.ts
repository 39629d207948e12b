/** One element of MathML, or a piece of text. */
export type MarkupNode = string | { tag: string; children: MarkupNode[] };

/** Elements that an equation needs; anything else makes the whole text be shown instead. */
const TAGS = new Set([
  'math',
  'mrow',
  'mi',
  'mn',
  'mo',
  'mtext',
  'mspace',
  'mstyle',
  'mfrac',
  'msqrt',
  'msup',
  'msub',
  'msubsup',
  'munder',
  'mover',
  'munderover',
]);

/**
 * Reads MathML of the service into a tree that React can draw, without its attributes.
 *
 * @param markup one `math` element.
 * @returns the tree, or null when the markup is broken or holds anything but mathematics.
 */
export function readMarkup(markup: string): MarkupNode | null {
  const page = new DOMParser().parseFromString(markup, 'application/xml');
  const root = page.documentElement;
  return root.localName === 'math' ? readElement(root) : null;
}

function readElement(element: Element): MarkupNode | null {
  if (!TAGS.has(element.localName)) return null;
  const children: MarkupNode[] = [];
  for (const child of element.childNodes) {
    if (child.nodeType === Node.TEXT_NODE) {
      // A space before a unit is meant; one between elements is layout.
      const text = child.textContent ?? '';
      if (text.trim() !== '') children.push(text);
    } else if (child.nodeType === Node.ELEMENT_NODE) {
      const inner = readElement(child as Element);
      if (inner === null) return null;
      children.push(inner);
    }
  }
  return { tag: element.localName, children };
}
