import { idOf, type Entered, type Entering } from './enter-job';
import type { RevisionServices } from './services-of-a-seed';

type Revising = Omit<Entering, 'services'> & { services: RevisionServices };

/** Freezes what is entered and sends it to the client, as it went out five days ago. */
export async function sendRevisionA({ services, member }: Revising, { job, ids }: Entered): Promise<void> {
  const revision = await services.revision.freeze(member, job.id);
  await services.revision.send(member, revision.id, {
    contactIds: [idOf(ids.contacts, 'marisel')],
    subject: `${job.number} ${job.name}: insulation takeoff, Revision ${revision.letter}`,
    words: [
      'Dear Marisel,',
      'Attached is our insulation schedule and takeoff for St Ellowyn, Revision A, from drawings M-201 to M-405.',
      'Please look at the flags first: the steam is specified thinner than the energy-code table entered asks, and the chilled water on the roof sweats in bright metal.',
      'Kind regards,\nTamsin Orrowby',
    ].join('\n\n'),
  });
}
