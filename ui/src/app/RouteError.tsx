import { Button, makeStyles, Text, tokens } from '@fluentui/react-components';
import { Link } from 'react-router-dom';
import { paths } from './paths';

const useStyles = makeStyles({
  root: {
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'flex-start',
    gap: tokens.spacingVerticalM,
    maxWidth: '60ch',
    padding: tokens.spacingHorizontalXXL,
  },
  title: { margin: 0, fontSize: tokens.fontSizeBase600, lineHeight: tokens.lineHeightBase600 },
  link: { alignSelf: 'center', color: tokens.colorBrandForegroundLink },
  actions: { display: 'flex', flexWrap: 'wrap', gap: tokens.spacingHorizontalM },
});

/** Stands in for a screen that broke or could not be loaded. */
export function RouteError() {
  const styles = useStyles();
  return (
    <main className={styles.root} role="alert">
      <h1 className={styles.title}>This page could not be shown.</h1>
      <Text>
        Nothing you entered is lost: readings that were not sent yet are kept in this browser. Load
        the page again; if that does not help, go back to the bench.
      </Text>
      <div className={styles.actions}>
        <Button appearance="primary" onClick={() => window.location.reload()}>
          Load the page again
        </Button>
        <Link to={paths.bench} className={styles.link}>
          Go to the bench
        </Link>
      </div>
    </main>
  );
}
