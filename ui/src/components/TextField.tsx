import { Field, Input, type InputProps, Textarea } from '@fluentui/react-components';
import { type Control, type FieldPath, type FieldValues, useController } from 'react-hook-form';

interface TextFieldProps<Values extends FieldValues> {
  control: Control<Values>;
  name: FieldPath<Values>;
  label: string;
  hint?: string;
  type?: InputProps['type'];
  autoComplete?: string;
  isRequired?: boolean;
  /** Lines shown; more than one makes a text area. */
  lines?: number;
  /** Shown as code is, for pasted documents. */
  isCode?: boolean;
  placeholder?: string;
}

/** One text field of a form, tied to its label, hint and error. */
export function TextField<Values extends FieldValues>(props: TextFieldProps<Values>) {
  const {
    field: { ref, name, value, onBlur, onChange },
    fieldState,
  } = useController({ control: props.control, name: props.name });
  const shared = {
    name,
    value: (value as string | undefined) ?? '',
    onBlur,
    placeholder: props.placeholder,
    autoComplete: props.autoComplete,
  };
  return (
    <Field
      label={props.label}
      hint={props.hint}
      required={props.isRequired}
      validationMessage={
        fieldState.error?.message && {
          // A list of column names has no spaces to break at.
          style: { overflowWrap: 'anywhere', minWidth: 0 },
          children: fieldState.error.message,
        }
      }
    >
      {props.lines && props.lines > 1 ? (
        <Textarea
          ref={ref}
          {...shared}
          rows={props.lines}
          resize="vertical"
          textarea={props.isCode ? { style: { fontFamily: 'monospace' } } : undefined}
          onChange={(_event, data) => onChange(data.value)}
        />
      ) : (
        <Input
          ref={ref}
          {...shared}
          size="large"
          type={props.type}
          onChange={(_event, data) => onChange(data.value)}
        />
      )}
    </Field>
  );
}
