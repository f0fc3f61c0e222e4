import type { Snapshot } from '@/api/contracts/revision';
import type { Locale } from '@/api/documents/locale';
import { artifact, hairline } from '@/api/documents/press/flow';
import { body, ink, page, styles } from '@/api/documents/press/ink';
import type { Press } from '@/api/documents/press/press';

export type Titles = { issue: string; dates: string; draft: boolean };

/** How a document names itself on every page. */
export function titlesOf(
  { job, letter, frozenAt, validUntil }: Snapshot,
  locale: Locale,
  draftAt: string | null,
): Titles {
  if (draftAt !== null)
    return { issue: `${job.number} DRAFT`, dates: `draft of ${locale.moment(draftAt)}, not issued`, draft: true };
  const since = frozenAt === null ? '' : locale.day(frozenAt);
  const until = validUntil === null ? '' : ` · valid to ${locale.date(validUntil)}`;
  return { issue: `${job.number} Revision ${letter ?? ''}`, dates: `${since}${until}`, draft: false };
}

/** The firm's mark: a ring with its bore off the centre. */
export function drawMark(
  document: PDFKit.PDFDocument,
  { x, y, radius }: { x: number; y: number; radius: number },
): void {
  document.circle(x, y, radius).fill(ink.oxide);
  document.circle(x + radius * 0.3, y + radius * 0.22, radius * 0.4).fill(ink.sheet);
}

/** Behind the text of a page that is not issued: outlined, so that what stands over it stays readable. */
export function drawDraft(document: PDFKit.PDFDocument): void {
  artifact({ document }, () => {
    document.save().rotate(-52, { origin: [page.width / 2, page.height / 2] });
    document.font('bold', 170).lineWidth(0.9).strokeColor(ink.rule);
    const options = { lineBreak: false, baseline: 'alphabetic', fill: false, stroke: true } as const;
    document.text('DRAFT', page.width / 2 - document.widthOfString('DRAFT') / 2, page.height / 2 + 56, options);
    document.restore();
  });
}

type Framed = { press: Press; snapshot: Snapshot; titles: Titles };

/** Head and foot of every page, once the number of pages is known. */
export function printFrames(framed: Framed): void {
  const { document } = framed.press;
  const { count } = document.bufferedPageRange();
  for (let index = 0; index < count; index += 1) {
    document.switchToPage(index);
    artifact({ document }, () => {
      printHead(framed);
      printFoot(framed, `page ${index + 1} of ${count}`);
    });
  }
}

function printHead({ press, snapshot, titles }: Framed): void {
  const { letterhead } = snapshot;
  const right = { x: body.right, align: 'right' as const };
  drawMark(press.document, { x: body.left + 11, y: 48, radius: 11 });
  const rightWidth = Math.max(
    press.wrap.width(titles.dates, styles.note),
    press.wrap.width(titles.issue, styles.bodyStrong),
  );
  const room = body.width - 44 - rightWidth;
  const address = [letterhead.address || letterhead.town, letterhead.email, letterhead.phone].filter(
    (text) => text !== '',
  );
  press.line(first(press, letterhead.name, { style: styles.subheading, width: room }), {
    x: body.left + 30,
    y: 33,
    style: styles.subheading,
  });
  press.line(first(press, address.join(' · '), { style: styles.note, width: room }), {
    x: body.left + 30,
    y: 49,
    style: styles.note,
  });
  printIssue(press, titles);
  press.line(titles.dates, { ...right, y: 49, style: styles.note });
  hairline(press, 73, { colour: ink.text, width: 1.4 });
}

/** A draft's name stands white on a dark field: no copier loses it. */
function printIssue(press: Press, { issue, draft }: Titles): void {
  const style = draft ? { ...styles.bodyStrong, colour: ink.sheet } : styles.bodyStrong;
  const width = press.wrap.width(issue, style);
  if (draft) press.document.roundedRect(body.right - width - 6, 33, width + 12, 15.5, 3).fill(ink.fail);
  press.line(issue, { x: body.right, y: 34, style, align: 'right' });
}

type Block = { style: (typeof styles)[keyof typeof styles]; width: number };
/** What fits on one line of it. */
function first({ wrap }: Press, text: string, { style, width }: Block): string {
  const [line = '', ...more] = wrap.lines(text, style, width - 8);
  return more.length > 0 ? `${line}…` : line;
}

function printFoot({ press, titles }: Framed, pageWords: string): void {
  const y = page.height - 46;
  hairline(press, y - 6);
  const words = `${titles.issue} · calculated for the conditions stated, not guaranteed`;
  press.line(words, { x: body.left, y, style: styles.note });
  press.line(pageWords, { x: body.right, y, style: styles.note, align: 'right' });
}
