import { StyleSheet, View } from 'react-native';

import { DrawnNumberedSection } from '@/components/drawing/drawn';
import { space } from '@/components/theme/tokens';
import { Heading } from '@/components/ui/heading';
import { Row, Stack } from '@/components/ui/stack';
import { Text } from '@/components/ui/text';
import { useUnits } from '@/hooks/use-units';

import { candidateName } from './candidate-words';
import { conditionsText } from './conditions-text';
import { sectionsOf, type StudiedRun } from './study-facts';

const surfaces = { cylinder: 'at the pipe', rectangle: 'at the metal', wall: 'at the plate' };

/** The selected thickness, large, with the temperature at each interface. */
export function SectionDetail({ runStudy, selected }: { runStudy: StudiedRun; selected: number }) {
  const { units, showWithUnit } = useUnits();
  const candidate = runStudy.study.candidates[selected];
  const drawn = sectionsOf(runStudy)[selected];
  if (!candidate || !drawn) return null;
  const { interfaces, judgedAt } = candidate.heat;
  const name = candidateName(candidate, units);
  const placeOf = (index: number) => {
    if (index === interfaces.length - 1) return 'at the surface';
    return index === 0 ? surfaces[drawn.shape] : `between layers ${index} and ${index + 1}`;
  };
  return (
    <Stack gap="xs">
      <Heading>{name === 'bare' ? 'Bare, in section' : `${name} in section`}</Heading>
      <View style={styles.beside}>
        <DrawnNumberedSection drawn={drawn} label={`Section to scale, ${name}`} />
        <View role="list" style={styles.list}>
          {interfaces.map((temperature, index) => (
            <View role="listitem" key={placeOf(index)}>
              <Row gap="xs" align="baseline">
                <Text weight="bold">{`${index + 1}`}</Text>
                <Text numeric weight="strong">
                  {showWithUnit('temperature', temperature)}
                </Text>
                <Text>{placeOf(index)}</Text>
              </Row>
            </View>
          ))}
          <Text size="small" tone="inkSoft">
            {conditionsText(judgedAt, units)}
          </Text>
        </View>
      </View>
    </Stack>
  );
}

const styles = StyleSheet.create({
  beside: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', columnGap: space.lg, rowGap: space.sm },
  list: { flexGrow: 1, flexShrink: 1, flexBasis: 200, gap: space.xxs, minWidth: 0 },
});
