import type { MailPreview } from '@/api/contracts/sending';
import type { Snapshot } from '@/api/contracts/revision';
import { createLocale } from '@/api/documents/locale';

import { mailHtml } from './mail-html';
import { mailText } from './mail-text';

export type MailInput = {
  subject: string;
  /** the estimator's covering words, paragraphs parted by an empty line */
  words: string;
  snapshot: Pick<
    Snapshot,
    'letter' | 'frozenAt' | 'validUntil' | 'timeZone' | 'letterhead' | 'job' | 'flags' | 'cautions'
  >;
  sender: { name: string; email: string };
  link: string;
  fileName: string;
};
/** What both forms of the mail say. */
export type MailContent = {
  subject: string;
  paragraphs: string[];
  firm: Snapshot['letterhead'];
  issue: string;
  facts: [name: string, value: string][];
  link: string;
  fileName: string;
  caution: string;
  sender: { name: string; email: string };
};

/** The mail that carries a takeoff: the same in the preview and on its way, but for the private link. */
export function takeoffMail(input: MailInput): MailPreview {
  const content = contentOf(input);
  return { subject: input.subject, text: mailText(content), html: mailHtml(content) };
}

function contentOf({ subject, words, snapshot, sender, link, fileName }: MailInput): MailContent {
  const { job, letter, letterhead } = snapshot;
  return {
    subject,
    paragraphs: words
      .replace(/\r\n?/g, '\n')
      .split(/\n[ \t]*\n+/)
      .filter((paragraph) => paragraph.trim() !== ''),
    firm: letterhead,
    issue: `${job.number} Revision ${letter ?? ''}`.trim(),
    facts: factsOf(snapshot),
    link,
    fileName,
    caution: snapshot.cautions[0] ?? '',
    sender,
  };
}

function factsOf({
  job,
  frozenAt,
  validUntil,
  flags,
  letterhead,
  timeZone,
}: MailInput['snapshot']): MailContent['facts'] {
  const locale = createLocale(letterhead.locale, timeZone);
  const facts: [string, string | null][] = [
    ['Job', job.name],
    ['Site', job.site],
    ['Date', frozenAt && locale.day(frozenAt)],
    ['Valid to', validUntil && locale.date(validUntil)],
    [
      'Please read first',
      flags.length > 0 ? 'the clarifications: they name every run that falls short of a limit' : null,
    ],
  ];
  return facts.flatMap(([name, value]): MailContent['facts'] => (value ? [[name, value]] : []));
}
