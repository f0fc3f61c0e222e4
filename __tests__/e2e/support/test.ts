import { test as base, type Browser, type BrowserContext, type Page } from '@playwright/test';

import { nobody, signIn, type Person, type SignedIn } from './people';
import { createWatch, type Watch } from './watch';

type Fixtures = {
  /** who is signed in on `page`; null: nobody */
  person: Person | null;
  /** hears what browsers complain about; the test ends with `expectQuiet` */
  watch: Watch;
  /** a page of its own for another person, or for nobody */
  openAs: (person: Person | null) => Promise<Page>;
};
type WorkerFixtures = { sessionOf: (person: Person) => Promise<SignedIn> };

/** Every test begins signed in as the estimator who may send, and fails when a console had an error in it. */
export const test = base.extend<Fixtures, WorkerFixtures>({
  // once for each person and worker, and only when a test asks for that person
  sessionOf: [
    async ({ browser }, provide, { project }) => {
      const sessions = new Map<Person, Promise<SignedIn>>();
      await provide((person) => {
        const session = sessions.get(person) ?? signIn(browser, person, project.use.baseURL);
        sessions.set(person, session);
        return session;
      });
    },
    { scope: 'worker' },
  ],
  person: ['tamsin', { option: true }],
  storageState: async ({ person, sessionOf }, provide) => provide(person ? await sessionOf(person) : nobody),
  watch: [
    async ({ context }, provide) => {
      const watch = createWatch();
      watch.listen(context);
      await provide(watch);
      watch.expectQuiet();
    },
    { auto: true },
  ],
  openAs: async ({ browser, sessionOf, watch }, provide) => {
    const opened: BrowserContext[] = [];
    await provide(async (person) => {
      const context = await openContext(browser, person ? await sessionOf(person) : nobody);
      opened.push(context);
      watch.listen(context);
      return context.newPage();
    });
    for (const context of opened) await context.close();
  },
});

// the project's viewport and address come with it
const openContext = (browser: Browser, storageState: SignedIn) => browser.newContext({ storageState });

export { expect } from '@playwright/test';
