import type { Clock } from '@/api/adapters/clock';
import type { LinkView } from '@/api/contracts/link';
import { snapshotSchema, type Snapshot } from '@/api/contracts/revision';
import { takeoffFileName } from '@/api/documents/file-name';
import { clarificationsOf } from '@/api/documents/takeoff/clarifications';
import { codeTitle } from '@/api/documents/takeoff/code-title';
import { conditionsInWords } from '@/api/documents/takeoff/conditions-in-words';
import { AppError } from '@/api/errors';
import type { LinkDoors } from '@/db/repositories/link-doors';

import { tokenHash } from './hashes';
import type { DocumentFile } from './revision-service';

/** Who asks, as coarse as it is kept: a network, a family of browsers. */
export type Visitor = { address: string; agent: string };

/** What a client's private link opens: one revision as it was sent to one contact. */
export function createLinkService({ doors, clock }: { doors: LinkDoors; clock: Clock }) {
  const opening = (token: string, visitor: Visitor) => ({ tokenHash: tokenHash(token), moment: clock(), ...visitor });
  return {
    /** @throws AppError `not-found` when no link has this token */
    async open(token: string, visitor: Visitor): Promise<LinkView> {
      const opened = await doors.open(opening(token, visitor));
      if (!opened) throw noSuchLink();
      return {
        state: opened.state,
        supersededBy: opened.superseded_by,
        contact: { name: opened.contact_name },
        pdfBytes: opened.pdf_bytes,
        sent: opened.snapshot === null ? null : viewOf(snapshotSchema.parse(opened.snapshot)),
      };
    },
    /** @throws AppError `not-found` when no link that still opens has this token */
    async pdf(token: string, visitor: Visitor): Promise<DocumentFile> {
      const stored = await doors.pdf(opening(token, visitor));
      if (!stored) throw noSuchLink();
      return { fileName: takeoffFileName(stored), bytes: stored.bytes, hash: stored.hash };
    },
  };
}
export type LinkService = ReturnType<typeof createLinkService>;

const noSuchLink = () => new AppError('not-found', 'This link does not exist, or no longer opens');

/** Only what the document itself tells the client. */
function viewOf(snapshot: Snapshot): NonNullable<LinkView['sent']> {
  const { letter, frozenAt, validUntil, timeZone, preparedBy, letterhead, schedule, takeoff, cautions } = snapshot;
  const { number, name, site, scope } = snapshot.job;
  return {
    letter,
    frozenAt,
    validUntil,
    timeZone,
    preparedBy,
    letterhead,
    schedule,
    takeoff,
    cautions,
    method: snapshot.method,
    engineVersion: snapshot.engineVersion,
    job: { number, name, site, scope, codeEdition: codeTitle(snapshot) },
    clarifications: clarificationsOf(snapshot).map(({ number: place, title, entries }) => ({
      number: place,
      title,
      entries,
    })),
    conditions: conditionsInWords(snapshot),
  };
}
