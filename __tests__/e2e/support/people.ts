import type { Browser, BrowserContextOptions } from '@playwright/test';

/** The demo's people by their first names, and what their role lets them do. */
export const people = {
  /** owner */
  hanneke: 'hanneke.vossidrow@brackwater.example',
  /** estimator, may not send */
  jorun: 'jorun.maplecoate@brackwater.example',
  /** estimator, may send */
  tamsin: 'tamsin.orrowby@brackwater.example',
  /** foreman */
  dov: 'dov.kessrick@brackwater.example',
} as const;
export type Person = keyof typeof people;

/** One for all of them, as `npm start` says it. */
export const password = process.env.DEMO_PASSWORD ?? 'plant-room-demo';

export type SignedIn = Exclude<BrowserContextOptions['storageState'], string | undefined>;

/** What a browser keeps in which nobody has signed in. */
export const nobody: SignedIn = { cookies: [], origins: [] };

/** Signs a person in as people do, on the page, and gives what the browser keeps of it. */
export async function signIn(browser: Browser, person: Person, baseURL?: string): Promise<SignedIn> {
  const context = await browser.newContext({ baseURL, storageState: nobody });
  const page = await context.newPage();
  await page.goto('/sign-in');
  await page.getByLabel('E-mail').fill(people[person]);
  await page.getByLabel('Password').fill(password);
  await page.getByRole('button', { name: 'Sign in' }).click();
  await page.getByRole('heading', { name: 'Jobs', level: 1 }).waitFor();
  const state = await context.storageState();
  await context.close();
  return state;
}
