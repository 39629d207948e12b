import { makeStyles, mergeClasses, Text, tokens } from '@fluentui/react-components';
import {
  BookOpenRegular,
  CalculatorRegular,
  DataLineRegular,
  EditRegular,
  FlowchartRegular,
  SearchRegular,
} from '@fluentui/react-icons';
import { type ReactNode, useEffect } from 'react';
import { NavLink } from 'react-router-dom';
import { type Case } from '@/lib/api-model';
import { atLeast, atMost, extraTokens } from '@/theme/extra-tokens';
import { caseNumber } from '../words/case-number';
import { CaseState } from './CaseTable';

const SECTIONS = [
  { section: 'intake', label: 'Intake', Icon: BookOpenRegular },
  { section: 'circuit', label: 'Circuit', Icon: FlowchartRegular },
  { section: 'readings', label: 'Readings', Icon: EditRegular },
  { section: 'compare', label: 'Compare', Icon: DataLineRegular },
  { section: 'suspects', label: 'Suspects', Icon: SearchRegular },
  { section: 'working', label: 'Working', Icon: CalculatorRegular },
] as const;

const useStyles = makeStyles({
  root: {
    [atMost.phone]: { paddingBottom: `calc(${extraTokens.bottomBarHeight} + 16px)` },
  },
  head: {
    display: 'flex',
    flexWrap: 'wrap',
    alignItems: 'center',
    gap: `${tokens.spacingVerticalXS} ${tokens.spacingHorizontalM}`,
    [atMost.phone]: { marginBottom: tokens.spacingVerticalL },
  },
  title: {
    margin: 0,
    fontSize: tokens.fontSizeBase600,
    lineHeight: tokens.lineHeightBase600,
    fontWeight: tokens.fontWeightSemibold,
    overflowWrap: 'anywhere',
    [atMost.phone]: { fontSize: tokens.fontSizeBase500, lineHeight: tokens.lineHeightBase500 },
  },
  quiet: { color: tokens.colorNeutralForeground3 },
  family: { [atMost.phone]: { display: 'none' } },
  nav: {
    display: 'flex',
    margin: `${tokens.spacingVerticalM} 0 ${tokens.spacingVerticalXL}`,
    borderBottom: `1px solid ${tokens.colorNeutralStroke2}`,
    [atMost.phone]: {
      position: 'fixed',
      zIndex: 10,
      left: 0,
      right: 0,
      bottom: 0,
      margin: 0,
      paddingBottom: 'env(safe-area-inset-bottom)',
      borderBottom: 'none',
      borderTop: `1px solid ${tokens.colorNeutralStroke1}`,
      backgroundColor: tokens.colorNeutralBackground1,
    },
  },
  link: {
    display: 'flex',
    alignItems: 'center',
    gap: tokens.spacingHorizontalXS,
    minHeight: extraTokens.touchHeight,
    padding: `0 ${tokens.spacingHorizontalL}`,
    color: tokens.colorNeutralForeground2,
    textDecoration: 'none',
    borderBottom: '3px solid transparent',
    ':hover': { backgroundColor: tokens.colorSubtleBackgroundHover },
    ':focus-visible': { outlineOffset: '-3px' },
    [atMost.phone]: {
      flexDirection: 'column',
      justifyContent: 'center',
      flex: '1 1 0',
      gap: '1px',
      minWidth: 0,
      minHeight: extraTokens.bottomBarHeight,
      padding: 0,
      fontSize: '11px',
      borderBottom: 'none',
      borderTop: '3px solid transparent',
    },
  },
  here: {
    color: tokens.colorBrandForeground1,
    fontWeight: tokens.fontWeightSemibold,
    borderBottomColor: tokens.colorBrandForeground1,
    [atMost.phone]: { borderTopColor: tokens.colorBrandForeground1 },
  },
  icon: { fontSize: '20px', display: 'flex', [atLeast.tablet]: { fontSize: '18px' } },
});

interface CaseFrameProps {
  repair: Case;
  linkTo: (section: (typeof SECTIONS)[number]['section']) => string;
  children: ReactNode;
}

/** Name, state and sections of a case; the sections stand at the bottom on a phone. */
export function CaseFrame({ repair, linkTo, children }: CaseFrameProps) {
  const styles = useStyles();
  const number = caseNumber(repair);
  useEffect(() => {
    document.title = `${repair.set} · ${number} · Ohmstead`;
  }, [repair.set, number]);
  return (
    <div className={styles.root}>
      <div className={styles.head}>
        <h1 className={styles.title}>{repair.set}</h1>
        <CaseState state={repair.state} />
        <Text className={styles.quiet}>
          {number}
          {repair.familyName && <span className={styles.family}> · {repair.familyName}</span>}
        </Text>
      </div>
      <nav aria-label="Sections of this case" className={styles.nav}>
        {SECTIONS.map(({ section, label, Icon }) => (
          <NavLink
            key={section}
            to={linkTo(section)}
            className={({ isActive }) => mergeClasses(styles.link, isActive && styles.here)}
          >
            <span className={styles.icon} aria-hidden="true">
              <Icon />
            </span>
            {label}
          </NavLink>
        ))}
      </nav>
      {children}
    </div>
  );
}
