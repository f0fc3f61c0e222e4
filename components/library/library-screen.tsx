import type { Href } from 'expo-router';
import { useState, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';

import type { Problem } from '@/api/contracts/problem';
import { measure } from '@/components/theme/tokens';
import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';
import { Grid, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { TextField } from '@/components/ui/text-field';

import { matches } from './library-words';

type LibraryScreenProps<Row> = {
  title: string;
  lead?: string;
  back?: { href: Href; label: string };
  rows: readonly Row[] | undefined;
  problem: Problem | undefined;
  onRetry: () => void;
  /** the words by which a row is found */
  wordsOf: (row: Row) => readonly string[];
  /** what the search looks for: "a material" */
  noun: string;
  /** text rather than a table: no wider than reads well */
  narrow?: boolean;
  /** a choice beside the search */
  filter?: ReactNode;
  children: (rows: readonly Row[]) => ReactNode;
};

const library = { href: '/library', label: 'Library' } as const;

/** One part of the library: searched, for reading. */
export function LibraryScreen<Row>(props: LibraryScreenProps<Row>) {
  const { title, lead, back = library, rows, problem, onRetry, wordsOf, noun, narrow, filter, children } = props;
  const [search, setSearch] = useState('');
  if (problem && !rows) return <ProblemScreen problem={problem} onRetry={onRetry} back={back} />;
  if (!rows) return <LoadingScreen title={title} back={back} shape="table" />;
  const found = search.trim() === '' ? rows : rows.filter((row) => matches(search.trim(), ...wordsOf(row)));
  return (
    <Screen title={title} lead={lead} back={back} narrow={narrow}>
      <Stack gap="xs">
        <View style={styles.tools}>
          <Grid column={280}>
            {filter}
            <TextField label={`Find ${noun}`} kind="search" inputMode="search" value={search} onChange={setSearch} />
          </Grid>
        </View>
        <Text role="status" size="small" tone="inkSoft">
          {search.trim() === '' ? `${rows.length} in all` : `${found.length} of ${rows.length} found`}
        </Text>
      </Stack>
      {found.length > 0 ? children(found) : <Text>Nothing in this part of the library has all of these words.</Text>}
    </Screen>
  );
}

const styles = StyleSheet.create({ tools: { maxWidth: measure } });
