import type { KeyboardEvent, Ref } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg from 'react-native-svg';

import type { Candidate } from '@/api/contracts/study';
import type { StripColumn as Placed } from '@/api/geometry/strip';
import { SectionPaths } from '@/components/diagram/section-paths';
import { fontFamily, radius, space } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';
import { Mark } from '@/components/ui/mark';
import { Text } from '@/components/ui/text';

import { marksOf } from './candidate-words';

type StripColumnProps = {
  ref?: Ref<HTMLButtonElement>;
  placed: Placed;
  /** from the top of the columns down to the base line */
  base: number;
  /** from the top of the drawing down to that of the columns */
  above: number;
  pitch: number;
  candidate: Candidate;
  name: string;
  heat: string;
  /** specified, chosen, proposed */
  words: readonly string[];
  /** all of it, said out */
  said: string;
  selected: boolean;
  onSelect: () => void;
  onKeyDown: (event: KeyboardEvent) => void;
};

/** From this width on the selected column has room for bold marks. */
const roomy = 80;
/** How far the selected section is lifted off the base line, and the room over the tallest one that this takes. */
const raise = 8;
export const headroom = raise + space.sm + 2;

export function StripColumn({ placed, base, above, pitch, candidate, selected, ...column }: StripColumnProps) {
  const theme = useTheme();
  const { name, heat, words, said, onSelect, onKeyDown, ref } = column;
  const { drawing, drawingLeft, left } = placed;
  const top = placed.drawingTop - above - (selected ? raise : 0);
  const cardTop = top + drawing.box.y - space.sm;
  return (
    <Element
      tag="button"
      ref={ref}
      type="button"
      role="radio"
      aria-checked={selected}
      aria-label={said}
      tabIndex={selected ? 0 : -1}
      onClick={onSelect}
      onKeyDown={onKeyDown}
      style={[styles.column, { width: pitch, paddingTop: base + space.xs }]}
    >
      {selected ? (
        <View style={[styles.card, { top: cardTop, backgroundColor: theme.sheet, borderColor: theme.oxide }]} />
      ) : null}
      <View style={[styles.drawing, { left: drawingLeft - left, top }]}>
        <Svg aria-hidden width={drawing.size} height={drawing.size} viewBox={`0 0 ${drawing.size} ${drawing.size}`}>
          <SectionPaths drawing={drawing} />
        </Svg>
      </View>
      <Text weight={selected ? 'bold' : 'strong'} align="center">
        {name}
      </Text>
      <Text size="small" tone="inkSoft" align="center" numeric>
        {heat}
      </Text>
      {marksOf(candidate).map((mark) => (
        <Mark key={mark.words} {...mark} align="center" strong={selected && pitch > roomy} />
      ))}
      <View style={styles.words}>
        {words.map((word) => (
          <Text key={word} size="small" weight="bold" tone={word === 'proposed' ? 'oxide' : 'ink'} align="center">
            {word}
          </Text>
        ))}
      </View>
    </Element>
  );
}

const styles = StyleSheet.create({
  column: webStyle({
    position: 'relative',
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'center',
    flexShrink: 0,
    boxSizing: 'border-box',
    margin: 0,
    paddingLeft: 3,
    paddingRight: 3,
    paddingBottom: space.sm,
    borderWidth: 0,
    backgroundColor: 'transparent',
    fontFamily,
    cursor: 'pointer',
    scrollSnapAlign: 'center',
    borderRadius: radius.md,
  }),
  card: webStyle({
    position: 'absolute',
    left: 1,
    right: 1,
    bottom: 0,
    borderWidth: 2,
    borderStyle: 'solid',
    borderRadius: radius.md,
    boxShadow: '0 2px 10px rgba(0, 0, 0, 0.12)',
  }),
  drawing: webStyle({ position: 'absolute', transitionProperty: 'top', transitionDuration: '120ms' }),
  words: webStyle({ marginTop: 'auto', paddingTop: space.xxs }),
});
