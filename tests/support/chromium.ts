import { readFileSync } from 'node:fs';
import { createRequire } from 'node:module';
import { type Browser, type BrowserContext, chromium, type Page } from 'playwright-core';
import { afterAll, beforeAll, inject } from 'vitest';
import { FACTORY_PASSWORD } from '#seeds/factories/password.ts';

const axeSource = readFileSync(createRequire(import.meta.url).resolve('axe-core/axe.min.js'), 'utf8');
const AXE_TAGS = ['wcag2a', 'wcag2aa', 'wcag21a', 'wcag21aa', 'wcag22aa'];

export interface AxeFinding {
  id: string;
  help: string;
  nodes: string[];
}

interface AxeRun {
  violations: { id: string; help: string; nodes: { html: string; failureSummary?: string }[] }[];
}

/** What axe finds on the page as it stands: for WCAG 2.2 A and AA, or for some rules alone. */
export async function axe(page: Page, rules: string[] = AXE_TAGS): Promise<AxeFinding[]> {
  if (!(await page.evaluate(() => 'axe' in window))) await page.evaluate(axeSource);
  const run = await page.evaluate(
    (only) =>
      (window as unknown as { axe: { run: (o: object) => Promise<AxeRun> } }).axe.run({
        runOnly: only,
        resultTypes: ['violations'],
      }),
    rules,
  );
  return run.violations.map(({ id, help, nodes }) => ({
    id,
    help,
    nodes: nodes.map((node) => `${node.html} ${node.failureSummary ?? ''}`),
  }));
}

/** Longest wait for anything on a page. */
const WAIT_MS = 15_000;

export const PHONE = { width: 390, height: 844 };
export const DESK = { width: 1280, height: 900 };

/** A person's browser: own cookies, own storage. Collects what went wrong in any of its tabs. */
export interface Visitor {
  context: BrowserContext;
  page: Page;
  /** Console errors, uncaught errors, blocked content and requests to other origins, in order. */
  troubles: string[];
}

interface VisitorOptions {
  viewport?: { width: number; height: number };
  colorScheme?: 'light' | 'dark';
}

/** One Chromium for a test file; each visitor gets a context of their own. */
export function withChromium() {
  let browser: Browser;
  beforeAll(async () => {
    browser = await chromium.launch({
      executablePath: process.env.CHROMIUM_PATH ?? '/usr/bin/chromium',
      args: ['--no-sandbox', '--disable-dev-shm-usage', '--disable-gpu', '--disable-background-networking'],
    });
  });
  afterAll(async () => {
    await browser?.close();
  });

  const visit = async ({ viewport = DESK, colorScheme = 'light' }: VisitorOptions = {}): Promise<Visitor> => {
    const context = await browser.newContext({ baseURL: inject('origin'), viewport, colorScheme, locale: 'en-GB' });
    context.setDefaultTimeout(WAIT_MS);
    const troubles: string[] = [];
    context.on('console', (message) => {
      // A refused sign-in and a first visit answer 401: the browser writes those to the console by itself.
      if (message.type() === 'error' && !message.text().includes('401')) troubles.push(message.text());
    });
    context.on('weberror', (error) => troubles.push(String(error.error())));
    context.on('request', (request) => {
      const { origin, protocol } = new URL(request.url());
      const isLocal = protocol === 'blob:' || protocol === 'data:';
      if (!isLocal && origin !== inject('origin')) troubles.push(`request to ${request.url()}`);
    });
    await context.addInitScript(() => {
      document.addEventListener('securitypolicyviolation', (event) =>
        console.error(`blocked by the content policy: ${event.violatedDirective} ${event.blockedURI}`),
      );
    });
    const page = await context.newPage();
    return { context, page, troubles };
  };

  /** Signs in over the API, so that a journey starts where it matters. */
  const signIn = async (
    person: { schoolCode: string; username: string },
    options: VisitorOptions = {},
  ): Promise<Visitor> => {
    const visitor = await visit(options);
    const response = await visitor.context.request.post('/api/sign-in', {
      headers: { 'Sec-Fetch-Site': 'same-origin' },
      data: {
        schoolCode: person.schoolCode,
        name: person.username,
        password: FACTORY_PASSWORD,
        isOwnDevice: false,
      },
    });
    if (!response.ok()) throw new Error(`sign-in answered ${response.status()}`);
    return visitor;
  };
  return { visit, signIn };
}
