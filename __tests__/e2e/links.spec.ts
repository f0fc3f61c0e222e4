import { messageSchema } from '@/api/contracts/revision';

import { write } from './support/api';
import { linkInMail } from './support/documents';
import { expectAccessible } from './support/expect-accessible';
import { expectScreen, open } from './support/open';
import { freezeJob, frozenJob, newContact, send } from './support/sending';
import { expect, test } from './support/test';

test('a private link: what was sent, superseded, withdrawn', async ({ page, openAs }) => {
  test.slow();
  const job = await frozenJob(page.request);
  const contact = await newContact(page.request, job, `clara.${crypto.randomUUID()}@client.example`);
  const subject = `Takeoff ${crypto.randomUUID().slice(0, 8)}`;
  const sent = await send(page.request, { revision: job.revision, contact, subject, until: 'sent' });

  const client = await openAs(null);
  const { link } = await linkInMail(client, subject);
  await open(client, link, job.job.name);
  await expect(client.getByText(`For ${contact.name}.`)).toBeVisible();
  await expectAccessible(client);
  await client.getByRole('button', { name: 'Conditions it was judged at' }).click();
  await expect(client.getByText('Service tunnel', { exact: true }).last()).toBeVisible();
  await expectAccessible(client);

  await freezeJob(page.request, job);
  await client.reload();
  await expect(client.getByText('Superseded by Revision B')).toBeVisible();
  await expectAccessible(client);

  const [message] = sent.messages;
  await write(page.request, { path: `/messages/${message?.id}/link-revocation`, body: {}, schema: messageSchema });
  await client.reload();
  await expect(client.getByText('This link was withdrawn')).toBeVisible();
  await expect(client.getByRole('link', { name: /^PDF/ })).toHaveCount(0);
  await expectAccessible(client);
});

test.describe('without an account', () => {
  test.use({ person: null });

  test('an address that nobody was sent says so and shows nothing', async ({ page, watch }) => {
    watch.allow(/status of 404/);
    await page.goto(`/links/${'x'.repeat(43)}`);
    await expectScreen(page, /./);
    await expect(page.getByRole('table')).toHaveCount(0);
    await expectAccessible(page);
  });
});
