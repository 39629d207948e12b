import { mergeClasses } from '@fluentui/react-components';
import { Suspense, useEffect, useRef } from 'react';
import { Link, NavLink, Outlet, ScrollRestoration, useLocation } from 'react-router-dom';
import { LoadingState } from '@/components/LoadingState';
import { Mark } from '@/components/Mark';
import { useSession } from '@/lib/session';
import { PersonMenu } from './PersonMenu';
import { paths } from './paths';
import { useShellStyles } from './Shell.styles';
import { useThemeOf } from './theme-choice';

/** The frame around every screen: skip link, ways to go, who is signed in. */
export function Component() {
  const styles = useShellStyles();
  const { data: person } = useSession();
  useThemeOf(person);
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const former = useRef(pathname);
  // A case keeps the focus while its sections change; another screen starts at its top.
  const screen = pathname.split('/').slice(0, 3).join('/');
  useEffect(() => {
    if (former.current !== screen && former.current !== pathname) main.current?.focus();
    former.current = screen;
  }, [screen, pathname]);

  const links = [
    { to: paths.bench, label: 'Bench', isExact: true },
    { to: paths.families, label: 'Families' },
    { to: paths.rules, label: 'Rules' },
    { to: paths.partsData, label: 'Parts data' },
    ...(person?.role === 'owner' ? [{ to: paths.people, label: 'People' }] : []),
  ];
  return (
    <div className={styles.root}>
      <a href="#main" className={styles.skip}>
        Skip to the content
      </a>
      <header className={styles.top}>
        <Link to={paths.bench} className={styles.home}>
          <Mark />
          Ohmstead
        </Link>
        <nav
          aria-label="Main"
          className={mergeClasses(styles.nav, pathname.startsWith('/cases/') && styles.navInCase)}
        >
          {links.map(({ to, label, isExact }) => (
            <NavLink
              key={to}
              to={to}
              end={isExact}
              data-label={label}
              className={({ isActive }) => mergeClasses(styles.link, isActive && styles.linkHere)}
            >
              {label}
            </NavLink>
          ))}
        </nav>
        {person && <PersonMenu person={person} className={styles.person} />}
      </header>
      <main id="main" ref={main} tabIndex={-1} className={styles.main}>
        <Suspense fallback={<LoadingState label="Opening the page" />}>
          <Outlet />
        </Suspense>
      </main>
      <ScrollRestoration />
    </div>
  );
}
