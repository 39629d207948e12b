import { FluentProvider, makeStyles } from '@fluentui/react-components';
import { type QueryClient, QueryClientProvider } from '@tanstack/react-query';
import { type ReactNode, useEffect } from 'react';
import { onSessionEnd } from '@/lib/access-token';
import { lampTheme, paperTheme } from '@/theme/themes';
import { useSignInAgain } from './sign-in-again';
import { useIsDark } from './theme-choice';

const useStyles = makeStyles({
  root: { minHeight: '100vh', backgroundColor: 'transparent' },
});

interface AppProvidersProps {
  queryClient: QueryClient;
  children: ReactNode;
}

/** Theme, server cache and what happens when a session ends; wraps every screen. */
export function AppProviders({ queryClient, children }: AppProvidersProps) {
  const styles = useStyles();
  const isDark = useIsDark();
  const theme = isDark ? lampTheme : paperTheme;

  useEffect(() => {
    onSessionEnd(useSignInAgain.getState().ask);
    return () => onSessionEnd(() => Promise.resolve(false));
  }, []);

  // Overscroll and the area behind dialogs show the body, which lies outside the provider.
  useEffect(() => {
    document.body.style.backgroundColor = theme.colorNeutralBackground3;
    document.documentElement.style.colorScheme = isDark ? 'dark' : 'light';
  }, [theme, isDark]);

  return (
    <FluentProvider theme={theme} className={styles.root}>
      <QueryClientProvider client={queryClient}>{children}</QueryClientProvider>
    </FluentProvider>
  );
}
