/** Widths and sizes that Fluent has no token for; used beside its tokens in `makeStyles`. */
export const extraTokens = {
  /** Least height of anything a thumb must hit. */
  touchHeight: '44px',
  /** Widest line of running text. */
  readingWidth: '68ch',
  /** Widest a list screen grows. */
  pageWidth: '1400px',
  /** Height of the bar at the bottom of a case on a phone. */
  bottomBarHeight: '60px',
} as const;

/** Media queries, narrow first. */
export const atMost = { phone: '@media (max-width: 699px)' } as const;
/** Media queries for more room. */
export const atLeast = {
  tablet: '@media (min-width: 700px)',
  wide: '@media (min-width: 1200px)',
} as const;
