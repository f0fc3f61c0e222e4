import { StyleSheet, View } from 'react-native';

import type { LinkView } from '@/api/contracts/link';
import { PdfLink } from '@/components/revision/pdf-link';
import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Heading } from '@/components/ui/heading';
import { Main } from '@/components/ui/main';
import { Notice } from '@/components/ui/notice';
import { Row } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useTitle } from '@/components/ui/use-title';

import { SentTakeoff, type Sent } from './sent-takeoff';

type LinkPageProps = { token: string; link: LinkView };

/** What a client sees: who sends what, until when it stands, and everything in it; the PDF is always at hand. */
export function LinkPage({ token, link }: LinkPageProps) {
  const theme = useTheme();
  const { sent } = link;
  useTitle(sent ? `${sent.job.number} Revision ${sent.letter ?? ''}` : 'Private link');
  return (
    <View style={[styles.page, { backgroundColor: theme.paper }]}>
      <Main>
        <View style={styles.column}>
          <StateNotice link={link} />
          {sent ? (
            <>
              <SentHead sent={sent} name={link.contact.name} />
              <SentTakeoff sent={sent} />
            </>
          ) : null}
        </View>
      </Main>
      {sent && link.pdfBytes ? (
        <View role="contentinfo" style={[styles.foot, { backgroundColor: theme.sheet, borderTopColor: theme.rule }]}>
          <Text tone="inkSoft">{`${sent.letterhead.name} · ${sent.preparedBy.email}`}</Text>
          <PdfLink path={`/links/${token}/pdf`} label={`PDF, ${sizeText(link.pdfBytes)}`} tone="action" download />
        </View>
      ) : null}
    </View>
  );
}

function SentHead({ sent, name }: { sent: Sent; name: string }) {
  const { letterhead, job, letter, preparedBy } = sent;
  return (
    <View style={styles.head}>
      <Row spread align="baseline">
        <Text weight="strong">{letterhead.name}</Text>
        <Text tone="inkSoft">{`Revision ${letter ?? ''}`}</Text>
      </Row>
      <Text tone="inkSoft">{[job.number, job.site].filter(Boolean).join(' · ')}</Text>
      <Heading level={1}>{job.name}</Heading>
      <Text>{`For ${name}. Insulation schedule and takeoff, prepared by ${preparedBy.name}. ${validText(sent)}`}</Text>
    </View>
  );
}

const validText = ({ validUntil }: Sent) =>
  validUntil
    ? `Valid until ${new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' }).format(new Date(validUntil))}.`
    : '';

const sizeText = (bytes: number) =>
  bytes < 1_000_000 ? `${Math.max(1, Math.round(bytes / 1000))} kB` : `${(bytes / 1_000_000).toFixed(1)} MB`;

function StateNotice({ link: { state, supersededBy } }: { link: LinkView }) {
  if (state === 'superseded')
    return (
      <Notice title={`Superseded by Revision ${supersededBy ?? ''}`}>
        This is an earlier revision. Use the newer one that was sent, or ask its sender for it.
      </Notice>
    );
  if (state === 'expired')
    return (
      <Notice title="This link has expired">
        Ask whoever sent it for a new one. The PDF in the mail stays with you.
      </Notice>
    );
  if (state === 'revoked')
    return <Notice title="This link was withdrawn">Its sender closed it. Ask them for a new one.</Notice>;
  return null;
}

const styles = StyleSheet.create({
  page: { flex: 1, minHeight: 0 },
  column: webStyle({
    maxWidth: 1100,
    width: '100%',
    marginLeft: 'auto',
    marginRight: 'auto',
    boxSizing: 'border-box',
    padding: space.md,
    gap: space.lg,
    display: 'flex',
    flexDirection: 'column',
  }),
  head: { gap: space.xs },
  foot: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignItems: 'center',
    justifyContent: 'space-between',
    gap: space.sm,
    paddingHorizontal: space.md,
    paddingVertical: space.sm,
    borderTopWidth: hairline,
  },
});
