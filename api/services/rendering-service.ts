import { snapshotSchema, type Snapshot } from '@/api/contracts/revision';
import { renderTakeoff } from '@/api/documents/takeoff-pdf';
import type { Behind, WithFirm } from '@/db/with-firm';

import { sha256 } from './hashes';

/** The worker's side of a revision. */
export function createRenderingService({ withFirm }: { withFirm: WithFirm }) {
  return {
    /** Renders the snapshot and stores its bytes, once; mails that waited for them may then go. */
    async render({ firmId, revisionId }: { firmId: string; revisionId: string }): Promise<void> {
      const snapshot = await withFirm(firmId, ({ revisions }) => unrendered(revisions, revisionId));
      if (!snapshot) return;
      try {
        const bytes = await renderTakeoff(snapshot, { draft: false });
        await withFirm(firmId, async ({ revisions, messages, enqueue }) => {
          if (!(await revisions.storePdf(revisionId, bytes, sha256(bytes)))) return;
          for (const messageId of await messages.waitingOf(revisionId)) await enqueue('send', { firmId, messageId });
        });
      } catch (error) {
        await withFirm(firmId, ({ revisions }) => revisions.markFailed(revisionId));
        throw error;
      }
    },
  };
}
export type RenderingService = ReturnType<typeof createRenderingService>;

/** The snapshot of a revision that has no bytes yet. */
async function unrendered(revisions: Behind['revisions'], id: string): Promise<Snapshot | undefined> {
  const revision = await revisions.find(id);
  if (!revision || revision.rendering === 'ready') return undefined;
  return snapshotSchema.parse(await revisions.snapshot(id));
}
