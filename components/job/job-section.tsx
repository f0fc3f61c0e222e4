import { StyleSheet, View } from 'react-native';

import { hairline, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { Disclosure } from '@/components/ui/disclosure';
import { Link } from '@/components/ui/link';
import { ListRows } from '@/components/ui/list-row';
import { Mark } from '@/components/ui/mark';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';

import type { JobSection as Section } from './sections';

type JobSectionProps = { section: Section; mayEdit: boolean };

/** One kind of thing that a job holds: closed it is counted and says what is missing; open it lists. */
export function JobSection({ section, mayEdit }: JobSectionProps) {
  if (section.items.length === 0) return <EmptySection section={section} mayEdit={mayEdit} />;
  const { title, href, add, gap, items } = section;
  return (
    <Disclosure summary={<Summary title={title} count={items.length} gap={gap} />}>
      <ListRows label={title} items={items} flush />
      <Row gap="md">
        <Link href={href} label="All in one table" />
        {mayEdit ? <Link href={add.href} label={add.label} /> : null}
      </Row>
    </Disclosure>
  );
}

function Summary({ title, count, gap }: { title: string; count: number; gap: string | null }) {
  return (
    <Stack gap="xxs">
      <Row align="baseline">
        <Text size="lead" weight="strong">
          {title}
        </Text>
        <Text tone="inkSoft" numeric>
          {count}
        </Text>
      </Row>
      {gap ? <Mark verdict="caution" words={gap} /> : null}
    </Stack>
  );
}

function EmptySection({ section: { title, add, empty }, mayEdit }: JobSectionProps) {
  const theme = useTheme();
  return (
    <View style={[styles.empty, { borderBottomColor: theme.rule }]}>
      <Stack gap="xxs" grow>
        <Text size="lead" weight="strong">
          {title}
        </Text>
        <Text tone="inkSoft">{empty}</Text>
      </Stack>
      {mayEdit ? <Link href={add.href} label={add.label} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  empty: {
    flexDirection: 'row',
    alignItems: 'center',
    gap: space.md,
    paddingVertical: space.sm,
    borderBottomWidth: hairline,
  },
});
