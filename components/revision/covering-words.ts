import type { Job } from '@/api/contracts/job';
import type { Revision } from '@/api/contracts/revision';
import type { SendInput } from '@/api/contracts/sending';

/** What a mail begins with; the sender changes it as he likes. */
export function coveringWords(job: Job, revision: Revision, sender: string): Pick<SendInput, 'subject' | 'words'> {
  const until = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' }).format(
    new Date(revision.validUntil),
  );
  const clarified =
    revision.flags > 0
      ? `\n\nPlease read the clarifications first: ${revision.flags === 1 ? 'one point needs' : `${revision.flags} points need`} your decision.`
      : '';
  return {
    subject: `Insulation takeoff ${job.number} Rev ${revision.letter} - ${job.name}`.slice(0, 200),
    words: `Attached is our insulation schedule and takeoff for ${job.name}, Revision ${revision.letter}, valid until ${until}.${clarified}\n\nRegards,\n${sender}`,
  };
}
