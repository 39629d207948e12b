import { Button, makeStyles } from '@fluentui/react-components';
import { useRef } from 'react';

const useStyles = makeStyles({ button: { alignSelf: 'flex-start' }, input: { display: 'none' } });

interface FileButtonProps {
  children: string;
  /** Kinds of file, as in the `accept` attribute. */
  accept: string;
  /** The file's text, read in the browser. */
  onRead: (text: string) => void;
}

/** Opens a text file of this device. */
export function FileButton({ children, accept, onRead }: FileButtonProps) {
  const styles = useStyles();
  const input = useRef<HTMLInputElement>(null);
  return (
    <>
      <Button className={styles.button} onClick={() => input.current?.click()}>
        {children}
      </Button>
      <input
        ref={input}
        type="file"
        accept={accept}
        className={styles.input}
        aria-hidden="true"
        tabIndex={-1}
        onChange={(event) => {
          const file = event.target.files?.[0];
          // Emptied, so that choosing the same file again reads it again.
          event.target.value = '';
          void file?.text().then(onRead);
        }}
      />
    </>
  );
}
