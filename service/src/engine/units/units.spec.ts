import fc from 'fast-check';
import { formatQuantity, parseQuantity, parseRating, type Unit } from '../units';

/** The value understood; a refusal makes the test fail with its sentence. */
function valueOf(text: string, unit: Unit): number | 'OL' {
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) throw new Error(parsed.message);
  return parsed.value;
}

function refusalOf(text: string, unit: Unit): string {
  const parsed = parseQuantity(text, unit);
  if (parsed.ok) throw new Error(`“${text}” was taken as ${parsed.value}.`);
  return parsed.message;
}

describe('a value as typed', () => {
  it.each<[string, Unit, number]>([
    ['118.4', 'V', 118.4],
    ['-0.636', 'V', -0.636],
    ['−12', 'V', -12],
    ['.5', 'A', 0.5],
    ['1e3', 'Ω', 1000],
    ['118.4 V', 'V', 118.4],
    ['118.4 VAC', 'V', 118.4],
    ['118.4 V AC', 'V', 118.4],
    ['4.7k', 'Ω', 4700],
    ['4.7 kΩ', 'Ω', 4700],
    ['4.7 k\u2126', 'Ω', 4700],
    ['4.7K ohms', 'Ω', 4700],
    ['2.2 meg', 'Ω', 2.2e6],
    ['1 megohm', 'Ω', 1e6],
    ['50 mΩ', 'Ω', 0.05],
    ['150mA', 'A', 0.15],
    ['0.1u', 'F', 1e-7],
    ['100 µF', 'F', 1e-4],
    ['100 μF', 'F', 1e-4],
    ['20 mfd', 'F', 2e-5],
    ['250 mmf', 'F', 2.5e-10],
    ['1.2 H', 'H', 1.2],
    ['60 Hz', 'Hz', 60],
    ['10 watts', 'W', 10],
  ])('takes %s as %s', (text, unit, value) => {
    expect(valueOf(text, unit)).toBe(value);
  });

  // IEC 60062, clause on the coding of values by letter.
  it.each<[string, Unit, number]>([
    ['4k7', 'Ω', 4700],
    ['2M2', 'Ω', 2.2e6],
    ['2R2', 'Ω', 2.2],
    ['R47', 'Ω', 0.47],
    ['4k7 Ω', 'Ω', 4700],
    ['4n7', 'F', 4.7e-9],
    ['2p2F', 'F', 2.2e-12],
    ['µ1', 'F', 1e-7],
    ['12V6', 'V', 12.6],
    ['1A5', 'A', 1.5],
  ])('takes the letter in %s for the decimal point', (text, unit, value) => {
    expect(valueOf(text, unit)).toBe(value);
  });

  it.each(['OL', 'ol', 'O.L', 'O.L.', '0L', '0.L', 'over'])('takes %s for over range', (text) => {
    expect(valueOf(text, 'Ω')).toBe('OL');
  });

  it.each<[string, number]>([
    ['1,5', 1.5],
    ['0,001', 0.001],
    ['1234,5', 1234.5],
    ['12,345.6', 12345.6],
    ['1,234,567', 1234567],
  ])('reads the comma of %s where it can be only one thing', (text, value) => {
    expect(valueOf(text, 'Ω')).toBe(value);
  });

  it.each(['1,000', '12,345', '1.234,5', '1,2,3'])('refuses the comma of %s', (text) => {
    expect(refusalOf(text, 'Ω')).toContain('two ways');
  });

  it('says which quantity was written and which the field wants', () => {
    expect(refusalOf('4.7kΩ', 'V')).toBe('This is a resistance; the field wants volts.');
    expect(refusalOf('2R2', 'V')).toBe('This is a resistance; the field wants volts.');
    expect(refusalOf('12.6V', 'A')).toBe('This is a voltage; the field wants amps.');
    expect(refusalOf('100u F', 'Ω')).toBe('This is a capacitance; the field wants ohms.');
  });

  it.each<[string, Unit]>([
    ['', 'V'],
    ['  ', 'V'],
    ['abc', 'V'],
    ['1.2.3', 'V'],
    ['1e999', 'V'],
    ['--5', 'V'],
    ['4.7 zΩ', 'Ω'],
    ['4k7k', 'Ω'],
    ['12V6mA', 'A'],
    ['1 000', 'Ω'],
    ['5 __proto__', 'Ω'],
    ['5 constructor', 'Ω'],
  ])('refuses “%s” with a full sentence', (text, unit) => {
    expect(refusalOf(text, unit)).toMatch(/^[“A-Z].*\.$/);
  });

  it('asks again where a small and a capital m are a factor of a thousand million apart', () => {
    expect(refusalOf('2.2m', 'Ω')).toContain('milliohms');
    expect(refusalOf('150MA', 'A')).toContain('millions of amps');
    expect(refusalOf('20 MF', 'F')).toContain('microfarads');
    expect(refusalOf('20 mF', 'F')).toContain('microfarads');
  });
});

describe('a value as shown', () => {
  it.each<[number | 'OL', Unit, number | undefined, string]>([
    [4700, 'Ω', undefined, '4.7 kΩ'],
    [0.05, 'Ω', undefined, '0.05 Ω'],
    [2.2e6, 'Ω', undefined, '2.2 MΩ'],
    [1e-4, 'F', undefined, '100 µF'],
    [4.7e-8, 'F', undefined, '47 nF'],
    [0.15, 'A', undefined, '150 mA'],
    [118.42, 'V', 4, '118.4 V'],
    [-0.636, 'V', undefined, '-636 mV'],
    [999.97, 'V', 4, '1 kV'],
    [999.7, 'V', 4, '999.7 V'],
    [118.42, 'V', 2, '118 V'],
    [0, 'V', undefined, '0 V'],
    [-0, 'V', undefined, '0 V'],
    ['OL', 'Ω', undefined, 'OL'],
    [NaN, 'Ω', undefined, '–'],
    [Infinity, 'Ω', undefined, '–'],
  ])('%s %s', (value, unit, digits, text) => {
    expect(formatQuantity(value, unit, digits)).toBe(text);
  });

  it('is read back as the same value, within its figures', () => {
    const units: Unit[] = ['V', 'A', 'Ω', 'H', 'W', 'Hz'];
    fc.assert(
      fc.property(
        fc.double({ min: 1e-9, max: 9e5, noNaN: true }),
        fc.constantFrom(...units),
        (value, unit) => {
          const back = valueOf(formatQuantity(value, unit, 6), unit) as number;
          return Math.abs(back - value) <= 1e-5 * value;
        },
      ),
    );
  });

  it('never throws on what a person may type', () => {
    fc.assert(
      fc.property(fc.string(), (text) => {
        const parsed = parseQuantity(text, 'Ω');
        return parsed.ok || parsed.message.endsWith('.');
      }),
    );
  });
});

describe('a rating', () => {
  it.each([
    ['12.6V 150mA', 12.6, 0.15],
    ['6.3 V, 0.3 A', 6.3, 0.3],
    ['150mA 12V6', 12.6, 0.15],
    ['50V/0.15A', 50, 0.15],
  ])('of %s', (text, volts, amps) => {
    expect(parseRating(text)).toEqual({ volts, amps });
  });

  it.each(['', '12.6V', '150mA', '12.6 0.15', '6.3V 12.6V 0.3A', '12.6V 4.7k'])(
    'is refused in “%s”',
    (text) => {
      expect(parseRating(text)).toBeNull();
    },
  );
});
