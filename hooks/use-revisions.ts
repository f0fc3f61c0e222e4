import { useEffect } from 'react';
import useSWR, { useSWRConfig } from 'swr';

import { messageSchema, revisionSchema, type Revision } from '@/api/contracts/revision';
import { mailPreviewSchema, type SendInput, type SettleInput } from '@/api/contracts/sending';
import { request, type RequestFailed } from '@/hooks/request';

const isMoving = ({ rendering, messages }: Revision) =>
  rendering === 'waiting' || messages.some(({ state }) => state === 'waiting' || state === 'sending');

/** A job's frozen revisions, newest first; read again every second while one is being rendered or sent. */
export function useRevisions(jobId: string) {
  const { data, error, mutate } = useSWR<Revision[], RequestFailed>(`/jobs/${jobId}/revisions`, (path: string) =>
    request(path, revisionSchema.array()),
  );
  // not SWR's own interval: where it begins at none, it is never asked again
  const moves = data?.some(isMoving) ?? false;
  useEffect(() => {
    if (!moves) return undefined;
    const timer = setInterval(() => void mutate(), 1000);
    return () => clearInterval(timer);
  }, [moves, mutate]);
  return { revisions: data, problem: error?.problem, reload: () => void mutate() };
}

/** What can be done with revisions; the list reads itself again after each. */
export function useRevisionActions(jobId: string) {
  const { mutate } = useSWRConfig();
  const listAgain = () => mutate(`/jobs/${jobId}/revisions`);
  const post = async <Shape>(path: string, schema: Parameters<typeof request<Shape>>[1], body: unknown) => {
    const answer = await request(path, schema, { method: 'POST', body });
    await listAgain();
    return answer;
  };
  return {
    freeze: () => post(`/jobs/${jobId}/revisions`, revisionSchema, {}),
    preview: (revisionId: string, input: SendInput) =>
      request(`/revisions/${revisionId}/mail-preview`, mailPreviewSchema, { method: 'POST', body: input }),
    send: (revisionId: string, input: SendInput) => post(`/revisions/${revisionId}/messages`, revisionSchema, input),
    settle: (messageId: string, input: SettleInput) => post(`/messages/${messageId}/settle`, messageSchema, input),
    revokeLink: (messageId: string) => post(`/messages/${messageId}/link-revocation`, messageSchema, {}),
  };
}
