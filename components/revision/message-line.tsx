import { useState } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Message } from '@/api/contracts/revision';
import type { SettleInput } from '@/api/contracts/sending';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { Button } from '@/components/ui/button';
import { ConfirmDialog } from '@/components/ui/confirm-dialog';
import { Mark } from '@/components/ui/mark';
import { Row } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { messageStateWords, momentText, openingsText } from './message-words';

type MessageLineProps = {
  message: Message;
  timeZone: string;
  maySend: boolean;
  onSettle: (as: SettleInput['as']) => Promise<unknown>;
  onRevoke: () => Promise<unknown>;
};

/** One mail to one person: its state in words, the server's own answer, and what can be done. */
export function MessageLine({ message, timeZone, maySend, onSettle, onRevoke }: MessageLineProps) {
  const theme = useTheme();
  const { verdict, words, more } = messageStateWords[message.state];
  const when = message.sentAt ? ` ${momentText(message.sentAt, timeZone)}` : '';
  return (
    <View role="listitem" style={[styles.line, { borderTopColor: theme.rule }]}>
      <Row spread align="baseline">
        <Text weight="strong">{`${message.to.name}, ${message.to.email}`}</Text>
        <Mark verdict={verdict} words={`${words}${when}`} size="body" strong />
      </Row>
      {more ? <Text size="small">{more}</Text> : null}
      {message.answer ? <Text size="small" tone="inkSoft">{`The mail server: ${message.answer}`}</Text> : null}
      {message.link ? (
        <Text size="small" tone="inkSoft">
          {openingsText(message, timeZone)}
        </Text>
      ) : null}
      {maySend ? <Actions message={message} onSettle={onSettle} onRevoke={onRevoke} /> : null}
    </View>
  );
}

type ActionsProps = Pick<MessageLineProps, 'message' | 'onSettle' | 'onRevoke'>;

function Actions({ message, onSettle, onRevoke }: ActionsProps) {
  const [asks, setAsks] = useState(false);
  const revoke = () => onRevoke().finally(() => setAsks(false));
  const isOpen = message.link && !message.link.revokedAt;
  const name = message.to.name;
  return (
    <Row>
      {message.state === 'perhaps-sent' ? <Button label="It arrived" onPress={() => void onSettle('sent')} /> : null}
      {message.state === 'perhaps-sent' || message.state === 'refused' ? (
        <Button label="Send again" onPress={() => void onSettle('send-again')} />
      ) : null}
      {message.state === 'perhaps-sent' ? (
        <Button label="It did not arrive" onPress={() => void onSettle('not-sent')} />
      ) : null}
      {isOpen ? <Button label="Revoke link" name={`Revoke the link of ${name}`} onPress={() => setAsks(true)} /> : null}
      {asks ? (
        <ConfirmDialog
          title={`Revoke the link of ${name}?`}
          confirm="Revoke"
          onConfirm={() => void revoke()}
          onCancel={() => setAsks(false)}
        >
          The link in the mail will open nothing any more. The PDF in the mail stays with its reader. This cannot be
          taken back.
        </ConfirmDialog>
      ) : null}
    </Row>
  );
}

const styles = StyleSheet.create({
  line: { paddingVertical: space.sm, gap: space.xxs, borderTopWidth: hairline },
});
