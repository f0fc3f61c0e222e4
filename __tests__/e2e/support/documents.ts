import { expect, type Locator, type Page } from '@playwright/test';

/** Where the local mail server shows what it took, as `npm start` says it. */
export const inboxUrl = process.env.INBOX_URL ?? '';

/** Freezes what stands now, on the documents screen; gives the new revision's letter. */
export async function freeze(page: Page): Promise<string> {
  const button = page.getByRole('button', { name: /^Freeze Revision/ });
  const letter = (await button.innerText()).replace('Freeze Revision ', '');
  await button.click();
  const question = page.getByRole('alertdialog', { name: `Freeze Revision ${letter}?` });
  await question.getByRole('button', { name: `Freeze Revision ${letter}` }).click();
  const pdf = revisionIn(page, letter).getByRole('link', { name: `PDF of Revision ${letter}` });
  await expect(pdf, 'The worker makes the PDF').toBeVisible({ timeout: 60_000 });
  return letter;
}

export const revisionIn = (page: Page, letter: string): Locator =>
  page.getByRole('region', { name: `Revision ${letter}`, exact: true });

type Mail = { page: Page; letter: string; to: string; subject: string };

/** Fills the send dialog for one recipient; what it holds otherwise stays. */
export async function addressMail({ page, letter, to, subject }: Mail): Promise<Locator> {
  await revisionIn(page, letter)
    .getByRole('button', { name: `Send Revision ${letter}` })
    .click();
  const dialog = page.getByRole('dialog', { name: `Send Revision ${letter}` });
  for (const box of await dialog.getByRole('checkbox').all()) await box.uncheck();
  await dialog.getByRole('checkbox', { name: to }).check();
  await dialog.getByLabel('Subject').fill(subject);
  return dialog;
}

/** The mail with this subject, read in the local inbox as a person would: its private link, and the file in it. */
export async function linkInMail(inbox: Page, subject: string): Promise<{ link: string; attachment: Buffer }> {
  await inbox.goto(inboxUrl);
  await inbox.getByRole('link', { name: subject }).click();
  await expect(inbox.getByRole('heading', { name: subject })).toBeVisible();
  const link = await inbox.locator('pre a').first().getAttribute('href');
  expect(link, 'The mail has its private link in it').toMatch(/\/links\/[\w-]{22,}$/);
  const file = await inbox.getByRole('link', { name: /\.pdf$/ }).getAttribute('href');
  const answer = await inbox.request.get(new URL(file ?? '', inboxUrl).href);
  return { link: link ?? '', attachment: await answer.body() };
}
