import type { Browser, BrowserContext, Page } from 'playwright-core';
import type { RunningInstallation } from '../../support/running-installation';

/** The password of everybody in the demo, as the sign-in page and README say. */
const DEMO_PASSWORD = 'strandline-demo';

/** One person's browser. Uncaught errors, console errors and violations of the content policy are collected for the test. */
export class Visit {
  readonly faults: string[] = [];

  private constructor(
    readonly page: Page,
    private readonly context: BrowserContext,
    private readonly installation: RunningInstallation,
  ) {}

  static async begin(browser: Browser, installation: RunningInstallation, width = 1280, height = 720): Promise<Visit> {
    const context = await browser.newContext({ viewport: { width, height }, locale: 'en-GB', acceptDownloads: true });
    const page = await context.newPage();
    const visit = new Visit(page, context, installation);
    page.on('pageerror', (error) => visit.faults.push(`uncaught: ${error.message}`));
    page.on('console', (message) => {
      // The browser itself reports every answer of 400 and more; what the page makes of it is what counts.
      if (message.type() === 'error' && !message.text().startsWith('Failed to load resource')) {
        visit.faults.push(`console: ${message.text()}`);
      }
    });
    await page.addInitScript(() => {
      addEventListener('securitypolicyviolation', (event) =>
        console.error(`policy: ${event.violatedDirective} ${event.blockedURI}`),
      );
    });
    return visit;
  }

  /** Signs in through the page, by the first name of somebody in the demo. */
  async signIn(person: keyof typeof PEOPLE): Promise<void> {
    await this.open('/sign-in');
    await this.page.getByLabel('E-mail').fill(PEOPLE[person]);
    await this.page.getByLabel('Password', { exact: true }).fill(DEMO_PASSWORD);
    await this.page.getByRole('button', { name: 'Sign in', exact: true }).click();
    await this.page.waitForURL((url) => !url.pathname.startsWith('/sign-in'));
  }

  async open(path: string): Promise<void> {
    await this.page.goto(this.installation.url + path);
  }

  async end(): Promise<void> {
    await this.context.close();
  }
}

/** Roles of the team "charging", and the administrator. */
export const PEOPLE = {
  administrator: 'orla.tenby@brackenholt.example',
  lead: 'runa.fellgarth@brackenholt.example',
  engineer: 'ivo.brasted@brackenholt.example',
  technician: 'tamsin.orrow@brackenholt.example',
  viewer: 'jonah.wexcombe@brackenholt.example',
  stranger: 'hanae.morwick@brackenholt.example',
} as const;
