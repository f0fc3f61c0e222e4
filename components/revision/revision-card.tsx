import type { Revision } from '@/api/contracts/revision';
import type { SettleInput } from '@/api/contracts/sending';
import { Button } from '@/components/ui/button';
import { Card } from '@/components/ui/card';
import { Heading } from '@/components/ui/heading';
import { Notice } from '@/components/ui/notice';
import { Progress } from '@/components/ui/progress';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { MessageLine } from './message-line';
import { momentText } from './message-words';
import { PdfLink } from './pdf-link';

type RevisionCardProps = {
  revision: Revision;
  timeZone: string;
  maySend: boolean;
  onSend: () => void;
  onSettle: (messageId: string, input: SettleInput) => Promise<unknown>;
  onRevoke: (messageId: string) => Promise<unknown>;
};

/** A frozen revision: what it holds, its PDF, to whom it went. */
export function RevisionCard({ revision, timeZone, maySend, onSend, onSettle, onRevoke }: RevisionCardProps) {
  const { letter, supersededBy, rendering, messages } = revision;
  return (
    <Card aria-label={`Revision ${letter}`} role="region">
      <Row spread align="baseline">
        <Heading>{`Revision ${letter}`}</Heading>
        <Text tone={supersededBy ? 'caution' : 'inkSoft'}>
          {supersededBy ? `superseded by ${supersededBy}` : 'current'}
        </Text>
      </Row>
      <Text tone="inkSoft">{contentsText(revision, timeZone)}</Text>
      {rendering === 'waiting' ? <Progress label="Making the PDF. You can leave; it goes on." /> : null}
      {rendering === 'failed' ? (
        <Notice tone="fail" title="The PDF could not be made">
          What was frozen is kept. Tell whoever runs this server; the reason stands in its log.
        </Notice>
      ) : null}
      <Row>
        {rendering === 'ready' ? (
          <PdfLink path={`/revisions/${revision.id}/pdf`} label={`PDF of Revision ${letter}`} />
        ) : null}
        {maySend && !supersededBy ? (
          <Button label="Send" name={`Send Revision ${letter}`} tone="action" onPress={onSend} />
        ) : null}
      </Row>
      {messages.length > 0 ? (
        <Stack gap="xxs" role="list" aria-label={`Mail of Revision ${letter}`}>
          {messages.map((message) => (
            <MessageLine
              key={message.id}
              message={message}
              timeZone={timeZone}
              maySend={maySend}
              onSettle={(as) => onSettle(message.id, { as, version: message.version })}
              onRevoke={() => onRevoke(message.id)}
            />
          ))}
        </Stack>
      ) : null}
    </Card>
  );
}

function contentsText({ runs, flags, frozenAt, frozenBy, validUntil }: Revision, timeZone: string): string {
  const flagged = flags === 0 ? 'no flags' : `${flags} ${flags === 1 ? 'flag' : 'flags'} as clarifications`;
  const until = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' }).format(new Date(validUntil));
  return `${runs} runs, ${flagged}. Frozen on ${momentText(frozenAt, timeZone)} by ${frozenBy}. Valid until ${until}.`;
}
