import { parseQuantity, type Unit } from '@engine/units';
import { Field, Input } from '@fluentui/react-components';
import { useState } from 'react';

export interface QuantityInputData {
  /** What was typed. */
  text: string;
  /** The value in SI units; undefined while empty or not understood. */
  value: number | undefined;
}

interface QuantityInputProps {
  label: string;
  unit: Unit;
  text: string;
  hint?: string;
  /** An error from elsewhere, shown before our own. */
  message?: string;
  isRequired?: boolean;
  onChange: (event: React.ChangeEvent<HTMLInputElement>, data: QuantityInputData) => void;
}

/** A value with its unit in one field: `118.4`, `4.7k`, `150mA`. */
export function QuantityInput(props: QuantityInputProps) {
  const [isLeft, setIsLeft] = useState(false);
  const parsed = readQuantity(props.text, props.unit);
  // Half a value is no mistake: it is judged once the field is left.
  const own = isLeft && !parsed.ok ? parsed.message : undefined;
  return (
    <Field
      label={props.label}
      hint={props.hint}
      required={props.isRequired}
      validationMessage={props.message ?? own}
    >
      <Input
        className="tabular"
        value={props.text}
        inputMode="text"
        autoComplete="off"
        contentAfter={props.unit}
        onBlur={() => setIsLeft(true)}
        onChange={(event, { value }) => {
          const next = readQuantity(value, props.unit);
          props.onChange(event, { text: value, value: next.ok ? next.value : undefined });
        }}
      />
    </Field>
  );
}

/**
 * Reads a typed quantity for a field that may be empty and cannot be open circuit.
 *
 * @param text what was typed.
 * @param unit unit meant when none is typed.
 * @returns the value in SI units, undefined for an empty text, or a sentence that says what is wrong.
 */
export function readQuantity(
  text: string,
  unit: Unit,
): { ok: true; value: number | undefined } | { ok: false; message: string } {
  if (text.trim() === '') return { ok: true, value: undefined };
  const parsed = parseQuantity(text, unit);
  if (!parsed.ok) return parsed;
  if (parsed.value === 'OL') return { ok: false, message: 'Type a number here, not OL.' };
  return { ok: true, value: parsed.value };
}
