/** Sections of a case, in the order of the work. */
export const CASE_SECTIONS = [
  'intake',
  'circuit',
  'readings',
  'compare',
  'suspects',
  'working',
] as const;
export type CaseSection = (typeof CASE_SECTIONS)[number];

/** Every address of the product, written once. */
export const paths = {
  bench: '/',
  signIn: (returnTo?: string) =>
    returnTo && returnTo !== '/' ? `/sign-in?to=${encodeURIComponent(returnTo)}` : '/sign-in',
  invitation: (token: string) => `/invitation/${encodeURIComponent(token)}`,
  case: (id: string | number, section: CaseSection = 'intake') =>
    `/cases/${encodeURIComponent(id)}/${section}`,
  families: '/families',
  family: (id: string | number) => `/families/${encodeURIComponent(id)}`,
  rules: '/rules',
  rule: (id: string) => `/rules/${encodeURIComponent(id)}`,
  partsData: '/parts-data',
  people: '/people',
} as const;

/**
 * Reads where to go after signing in.
 *
 * @param search query string of the sign-in page.
 * @returns a path of our own; the bench when none was given or it leads elsewhere.
 */
export function returnPath(search: string): string {
  const to = new URLSearchParams(search).get('to') ?? '';
  return /^\/(?![/\\])/.test(to) ? to : paths.bench;
}
