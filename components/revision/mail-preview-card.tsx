import { StyleSheet } from 'react-native';

import type { MailPreview } from '@/api/contracts/sending';
import { hairline } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';
import { Heading } from '@/components/ui/heading';
import { Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import { withStyleSheet } from './mail-frame';

/** The mail as its reader gets it: the HTML without scripts, and the plain text. */
export function MailPreviewCard({ preview }: { preview: MailPreview }) {
  const theme = useTheme();
  const frame = { borderColor: theme.rule };
  return (
    <Stack gap="xs">
      <Heading level={3}>{preview.subject}</Heading>
      <Element
        tag="iframe"
        title="The mail"
        sandbox=""
        srcDoc={withStyleSheet(preview.html)}
        style={[styles.frame, frame]}
      />
      <Text size="small" tone="inkSoft">
        In a mail program without HTML:
      </Text>
      <Element tag="pre" tabIndex={0} style={[styles.text, frame, { color: theme.ink }]}>
        {preview.text}
      </Element>
    </Stack>
  );
}

const styles = StyleSheet.create({
  frame: webStyle({
    width: '100%',
    height: 360,
    borderWidth: hairline,
    borderStyle: 'solid',
    backgroundColor: 'white',
    boxSizing: 'border-box',
  }),
  text: webStyle({
    whiteSpace: 'pre-wrap',
    overflowWrap: 'anywhere',
    margin: 0,
    padding: 12,
    fontSize: 13,
    borderWidth: hairline,
    borderStyle: 'solid',
  }),
});
