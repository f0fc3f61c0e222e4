import { StyleSheet, View } from 'react-native';

import { space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { Select } from '@/components/ui/select';
import { Text } from '@/components/ui/text';

import type { FilterChoice, FilterKey, RunFilter } from './run-filters';

type RunFilterBarProps = {
  choices: readonly FilterChoice[];
  filter: RunFilter;
  onChange: (key: FilterKey, value: string) => void;
  onClear: () => void;
};

const all = 'all';

/** One list for each thing that runs can be narrowed by; on a phone they are folded away until asked for. */
export function RunFilterBar(props: RunFilterBarProps) {
  const { isPhone } = useLayout();
  if (!isPhone) return <FilterLists {...props} />;
  return (
    <Disclosure summary={<Text>{narrowedText(props)}</Text>}>
      <FilterLists {...props} />
    </Disclosure>
  );
}

/** "Narrow the list", or what it is narrowed to: "Steam, Service tunnel". */
function narrowedText({ choices, filter }: RunFilterBarProps): string {
  const chosen = choices.flatMap(({ key, options }) => options.find(({ value }) => value === filter[key])?.label ?? []);
  return chosen.join(', ') || 'Narrow the list';
}

function FilterLists({ choices, filter, onChange, onClear }: RunFilterBarProps) {
  const isNarrowed = Object.values(filter).some(Boolean);
  return (
    <View role="group" aria-label="Narrow the list" style={styles.bar}>
      {choices.map(({ key, label, options }) => (
        <View key={key} style={styles.filter}>
          <Select<string>
            label={label}
            value={filter[key] || all}
            options={[{ value: all, label: 'All' }, ...options]}
            onChange={(value) => onChange(key, value === all ? '' : value)}
          />
        </View>
      ))}
      {isNarrowed ? <Button label="Show all" onPress={onClear} /> : null}
    </View>
  );
}

const styles = StyleSheet.create({
  bar: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'flex-end', gap: space.sm },
  filter: { minWidth: 132, flexGrow: 1, flexShrink: 1, flexBasis: 132, maxWidth: 260 },
});
