import type { Message } from '@/api/contracts/revision';
import { messageStateWords, openingsText } from '@/components/revision/message-words';

const message: Message = {
  id: 'm',
  version: 1,
  revisionId: 'r',
  contactId: 'c',
  to: { name: 'Marisel Quonder', email: 'marisel@quonder.example' },
  subject: '',
  state: 'sent',
  answer: '250 ok',
  attempts: 1,
  createdAt: '2026-11-26T15:40:00Z',
  sentAt: '2026-11-26T15:40:05Z',
  messageId: '<a@b>',
  link: { expiresAt: '2027-01-11T00:00:00Z', revokedAt: null, openings: 0, lastOpenedAt: null },
};

it('says whether a private link was opened, and when it opens no more, in the zone of the job', () => {
  const at = (link: Partial<NonNullable<Message['link']>>) =>
    openingsText({ ...message, link: { ...message.link!, ...link } }, 'Europe/Dublin');
  expect(at({})).toBe('The link has not been opened. It opens until 11 Jan 2027, 00:00.');
  expect(at({ openings: 2, lastOpenedAt: '2026-06-30T12:00:00Z' })).toContain('opened 2 times');
  expect(at({ openings: 1, lastOpenedAt: '2026-06-30T12:00:00Z' })).toContain(
    'opened once, last on 30 Jun 2026, 13:00',
  );
  expect(at({ revokedAt: '2026-12-01T09:30:00Z' })).toBe('The link was revoked on 1 Dec 2026, 09:30.');
});

it('never calls a mail sent that perhaps was', () => {
  expect(messageStateWords['perhaps-sent']).toMatchObject({ verdict: 'caution', words: 'perhaps sent' });
});
