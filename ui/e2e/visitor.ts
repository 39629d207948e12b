import { mkdir } from 'node:fs/promises';
import { fileURLToPath } from 'node:url';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';
import { type SignIn } from './shop';

const ARGUMENTS = [
  '--no-sandbox',
  '--disable-gpu',
  '--disable-quic',
  '--no-first-run',
  '--disable-background-networking',
  '--disable-component-update',
  '--disable-sync',
];

/** Where pictures of failed journeys go; not kept in the repository. */
const OUTPUT = fileURLToPath(new URL('./output/', import.meta.url));

/** Screens that the journeys are made on. */
export const SCREENS = {
  desktop: { width: 1440, height: 900 },
  phone: { width: 390, height: 844 },
} as const;
export type ScreenName = keyof typeof SCREENS;

/** Starts the browser that all visitors of a file share. */
export function startBrowser(): Promise<Browser> {
  const executablePath = process.env.CHROMIUM ?? '/usr/bin/chromium';
  return chromium.launch({ executablePath, args: ARGUMENTS });
}

/** One person at one screen, with everything that went wrong in their page. */
export interface Visitor {
  page: Page;
  context: BrowserContext;
  /** Console errors, uncaught errors and failed requests so far, as sentences. */
  troubles: string[];
  /** Takes a picture into the output folder. */
  picture: (name: string) => Promise<void>;
  leave: () => Promise<void>;
}

/** Requests whose refusal is part of a journey. */
export interface Expected {
  method: string;
  path: RegExp;
  status: number;
}

interface VisitOptions {
  screen?: ScreenName;
  /** The person asked their device for dark pages. */
  isDark?: boolean;
  /** Refusals that belong to the journey. */
  expected?: Expected[];
  /** Cookies and storage of an earlier visit. */
  kept?: Awaited<ReturnType<BrowserContext['storageState']>>;
}

/** Asking who is signed in is refused while nobody is; every first visit does it. */
const NOBODY_YET: Expected = { method: 'POST', path: /^\/api\/auth\/refresh$/, status: 401 };

/**
 * Opens a page of its own cookies and storage.
 *
 * @param browser where it opens.
 * @param url address that relative paths count from.
 */
export async function visit(
  browser: Browser,
  url: string,
  options: VisitOptions = {},
): Promise<Visitor> {
  const { screen = 'desktop', isDark = false, expected = [], kept } = options;
  const context = await browser.newContext({
    baseURL: url,
    storageState: kept,
    viewport: SCREENS[screen],
    hasTouch: screen === 'phone',
    colorScheme: isDark ? 'dark' : 'light',
    locale: 'en-US',
    // Pictures and axe look at what stands still.
    reducedMotion: 'reduce',
  });
  const page = await context.newPage();
  const troubles: string[] = [];
  const isExpected = (method: string, path: string, status: number) =>
    [NOBODY_YET, ...expected].some(
      (one) => one.method === method && one.status === status && one.path.test(path),
    );
  page.on('pageerror', (error) => troubles.push(`Uncaught: ${error.message}`));
  page.on('console', (message) => {
    // The browser's own line about a refused request; the answer itself is judged below.
    if (message.text().startsWith('Failed to load resource')) return;
    if (message.type() === 'error') troubles.push(`Console: ${message.text()}`);
  });
  page.on('requestfailed', (request) => {
    const why = request.failure()?.errorText ?? 'unknown';
    // A screen that is left gives up what it was still asking for.
    if (why === 'net::ERR_ABORTED') return;
    troubles.push(`Failed: ${request.method()} ${request.url()} (${why})`);
  });
  page.on('response', (response) => {
    const path = new URL(response.url()).pathname;
    const method = response.request().method();
    if (response.status() < 400 || isExpected(method, path, response.status())) return;
    troubles.push(`Refused: ${method} ${path} with ${response.status()}`);
  });
  return {
    page,
    context,
    troubles,
    picture: async (name) => {
      await mkdir(OUTPUT, { recursive: true });
      await page.screenshot({ path: `${OUTPUT}${name}.png` });
    },
    leave: () => context.close(),
  };
}

/** Signs somebody in at the door and waits for the bench. */
export async function signIn(page: Page, person: SignIn | undefined): Promise<void> {
  if (!person) throw new Error('The demo shop printed no sign-in for this role.');
  await page.goto('/sign-in');
  await page.getByLabel('E-mail address').fill(person.email);
  await page.getByLabel('Password').fill(person.password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { name: 'Bench', level: 1 }).waitFor();
}
