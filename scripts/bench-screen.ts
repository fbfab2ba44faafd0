/**
 * The screen's part of npm run bench, against a served build (npm start in another terminal, or
 * BASE_URL and SIGN_INS): scripts sent, and how long a keystroke takes to redraw floor and chart.
 */

import { chromium, type Page } from '@playwright/test';
import playwright from '../playwright.config';
import { builder, signIn } from '../tests/support/sign-ins';
import { makeDesign } from '../tests/support/design-screen';

const KEYSTROKES = 21;

const median = (values: number[]): number =>
  [...values].sort((a, b) => a - b)[values.length >> 1]!;

/** Bytes of the scripts that a page has asked for, as they travelled. */
function scriptBytes(page: Page): Promise<number> {
  return page.evaluate(() =>
    (performance.getEntriesByType('resource') as PerformanceResourceTiming[])
      .filter((entry) => /\.js(\?|$)/.test(entry.name))
      .reduce((sum, entry) => sum + entry.encodedBodySize, 0),
  );
}

interface Redraw {
  /** From the keystroke to the first frame with another rotor outline, ms. */
  readonly all: number;
  /** From the kernel's answer to that outline, ms: what the screen itself takes. */
  readonly screen: number;
}

/** Notes when the kernel's worker last answered, from before the page's own scripts run. */
async function noteAnswers(page: Page): Promise<void> {
  await page.addInitScript(() => {
    const Plain = window.Worker;
    window.Worker = class extends Plain {
      constructor(...args: ConstructorParameters<typeof Worker>) {
        super(...args);
        this.addEventListener('message', () => {
          (window as unknown as { answered: number }).answered = performance.now();
        });
      }
    };
  });
}

async function keystroke(page: Page, text: string): Promise<Redraw> {
  await page.evaluate(() => {
    const rotor = document.querySelector('[data-part=rotor]')!;
    const state = window as unknown as { redrawn: Promise<Redraw>; answered: number };
    state.redrawn = new Promise((resolve) => {
      let typed = 0;
      document.addEventListener('input', () => (typed = performance.now()), { once: true });
      const observer = new MutationObserver(() => {
        observer.disconnect();
        const screen = performance.now() - state.answered;
        requestAnimationFrame(() => resolve({ all: performance.now() - typed, screen }));
      });
      observer.observe(rotor, { subtree: true, attributes: true, attributeFilter: ['d'] });
    });
  });
  await page.getByRole('textbox', { name: 'Air gap', exact: true }).fill(text);
  return page.evaluate(() => (window as unknown as { redrawn: Promise<Redraw> }).redrawn);
}

const browser = await chromium.launch(playwright.use!.launchOptions);
const page = await browser.newPage({
  baseURL: process.env.BASE_URL ?? 'http://127.0.0.1:3000',
  viewport: { width: 1440, height: 900 },
});
await noteAnswers(page);
await signIn(page, builder);
await page.goto('/designs');
await page.waitForLoadState('networkidle');
const list = await scriptBytes(page);
await makeDesign(page, 'Bench');
await page.reload();
await page.waitForLoadState('networkidle');
const screen = await scriptBytes(page);
const times: Redraw[] = [];
for (let i = 0; i < KEYSTROKES; i++) times.push(await keystroke(page, `0.5${i + 10} mm`));
console.table([
  { what: 'scripts of the list of designs, kB', value: (list / 1000).toFixed(1), goal: '170' },
  {
    what: 'scripts of the design screen, 3D included, the kernel in its worker not, kB',
    value: (screen / 1000).toFixed(1),
    goal: '420',
  },
  {
    what: 'kernel’s answer to redrawn floor and chart, ms',
    value: median(times.map(({ screen }) => screen)).toFixed(1),
    goal: '16.7',
  },
  {
    what: 'keystroke to the frame that shows it, kernel and drawing included, ms',
    value: median(times.map(({ all }) => all)).toFixed(1),
    goal: '',
  },
]);
await browser.close();
