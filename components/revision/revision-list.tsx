import { useState } from 'react';

import type { Job } from '@/api/contracts/job';
import type { Revision } from '@/api/contracts/revision';
import { Stack } from '@/components/ui/stack';
import { useContacts } from '@/hooks/use-contacts';
import { useRevisionActions } from '@/hooks/use-revisions';
import { useMay, useSession } from '@/hooks/use-session';

import { coveringWords } from './covering-words';
import { RevisionCard } from './revision-card';
import { SendDialog } from './send-dialog';

type RevisionListProps = { job: Job; revisions: readonly Revision[]; timeZone: string };

/** A job's revisions, newest first, with all that can be done with each. */
export function RevisionList({ job, revisions, timeZone }: RevisionListProps) {
  const { session } = useSession();
  const { contacts = [] } = useContacts();
  const { preview, send, settle, revokeLink } = useRevisionActions(job.id);
  const maySend = useMay('send');
  const [sending, setSending] = useState<string>();
  const revision = revisions.find(({ id }) => id === sending);
  const ofJob = job.contactIds.flatMap((id) => contacts.find((contact) => contact.id === id) ?? []);
  return (
    <Stack gap="md">
      {revisions.map((one) => (
        <RevisionCard
          key={one.id}
          revision={one}
          timeZone={timeZone}
          maySend={maySend}
          onSend={() => setSending(one.id)}
          onSettle={settle}
          onRevoke={revokeLink}
        />
      ))}
      {revision && session ? (
        <SendDialog
          revision={revision}
          contacts={ofJob}
          defaults={coveringWords(job, revision, session.member.name)}
          onPreview={(input) => preview(revision.id, input)}
          onSend={(input) => send(revision.id, input)}
          onClose={() => setSending(undefined)}
        />
      ) : null}
    </Stack>
  );
}
