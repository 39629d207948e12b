import { makeStyles, tokens } from '@fluentui/react-components';

/** A form with its fields one below the other. */
export const useFormStyles = makeStyles({
  form: { display: 'flex', flexDirection: 'column', gap: tokens.spacingVerticalL },
});
