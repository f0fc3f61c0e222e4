import { expect, type BrowserContext } from '@playwright/test';

/**
 * Hears every error in the consoles of the pages it listens to: uncaught ones, what the content security policy
 * refused, what could not be loaded.
 */
export function createWatch() {
  const complaints: string[] = [];
  const allowed: RegExp[] = [];
  return {
    listen(context: BrowserContext): void {
      context.on('weberror', (thrown) => complaints.push(String(thrown.error())));
      context.on('console', (message) => {
        if (message.type() === 'error') complaints.push(`${message.text()} (${message.location().url})`);
      });
    },
    /** A browser says every refused request in its console; a test that asks for one says so here. */
    allow(pattern: RegExp): void {
      allowed.push(pattern);
    },
    expectQuiet(): void {
      expect(
        complaints.filter((complaint) => !allowed.some((pattern) => pattern.test(complaint))),
        'The browser’s console has errors in it',
      ).toEqual([]);
    },
  };
}
export type Watch = ReturnType<typeof createWatch>;
