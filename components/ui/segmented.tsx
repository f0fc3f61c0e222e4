import { useId, useRef, type KeyboardEvent } from 'react';
import { StyleSheet, View } from 'react-native';

import { fontFamily, hairline, radius, space, touchTarget, type, weight } from '@/components/theme/tokens';
import { useTheme } from '@/components/theme/use-theme';
import { webStyle } from '@/components/theme/web-style';

import { Element } from './element';
import { ProblemText } from './field';
import { Text } from './text';

export type Segment<Value extends string = string> = { value: Value; label: string; name?: string };

export type SegmentedProps<Value extends string = string> = {
  label: string;
  /** the label is read, not drawn */
  hideLabel?: boolean;
  value: Value;
  segments: readonly Segment<Value>[];
  onChange: (value: Value) => void;
  onBlur?: () => void;
  hint?: string;
  problem?: string;
  /** as wide as its place, in equal parts */
  fill?: boolean;
};

const steps: Record<string, number> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/** One of a few, all in sight. One stop for the Tab key; arrows walk and choose. */
export function Segmented<Value extends string>(props: SegmentedProps<Value>) {
  const { label, hideLabel, value, segments, onChange, onBlur, hint, problem, fill } = props;
  const theme = useTheme();
  const id = useId();
  const group = useRef<HTMLDivElement>(null);
  const at = segments.findIndex((segment) => segment.value === value);
  const walk = (event: KeyboardEvent) => {
    const step = steps[event.key];
    if (!step) return;
    event.preventDefault();
    const next = (Math.max(at, 0) + step + segments.length) % segments.length;
    const segment = segments[next];
    if (!segment) return;
    onChange(segment.value);
    group.current?.querySelectorAll<HTMLElement>('[role="radio"]')[next]?.focus();
  };
  return (
    <View style={styles.field}>
      {hideLabel ? null : (
        <Text id={id} weight="strong">
          {label}
        </Text>
      )}
      <Element
        tag="div"
        ref={group}
        role="radiogroup"
        aria-label={hideLabel ? label : undefined}
        aria-labelledby={hideLabel ? undefined : id}
        aria-describedby={problem ? `${id}-problem` : hint ? `${id}-hint` : undefined}
        onKeyDown={walk}
        onBlur={onBlur}
        style={[styles.group, fill && styles.fill, { borderColor: theme.rule, backgroundColor: theme.sheet }]}
      >
        {segments.map((segment, index) => (
          <Choice
            key={segment.value}
            segment={segment}
            chosen={index === at}
            // with nothing chosen yet the first one is where Tab arrives
            reachable={index === Math.max(at, 0)}
            onChoose={() => onChange(segment.value)}
            fill={fill}
          />
        ))}
      </Element>
      {hint ? (
        <Text id={`${id}-hint`} size="small" tone="inkSoft">
          {hint}
        </Text>
      ) : null}
      {problem ? <ProblemText id={`${id}-problem`} text={problem} /> : null}
    </View>
  );
}

type ChoiceProps = { segment: Segment; chosen: boolean; reachable: boolean; onChoose: () => void; fill?: boolean };

function Choice({ segment, chosen, reachable, onChoose, fill }: ChoiceProps) {
  const theme = useTheme();
  const colours = chosen
    ? { backgroundColor: theme.paper, borderColor: theme.oxide, color: theme.ink }
    : { backgroundColor: 'transparent', borderColor: 'transparent', color: theme.inkSoft };
  return (
    <Element
      tag="button"
      type="button"
      role="radio"
      aria-checked={chosen}
      aria-label={segment.name}
      tabIndex={reachable ? 0 : -1}
      onClick={onChoose}
      style={[styles.choice, colours, chosen && styles.chosen, fill && styles.part]}
    >
      {segment.label}
    </Element>
  );
}

const styles = StyleSheet.create({
  field: { gap: space.xxs, minWidth: 0 },
  group: webStyle({
    display: 'flex',
    flexDirection: 'row',
    flexWrap: 'wrap',
    alignSelf: 'flex-start',
    borderWidth: hairline,
    borderStyle: 'solid',
    borderRadius: radius.sm,
    maxWidth: '100%',
  }),
  choice: webStyle({
    boxSizing: 'border-box',
    minHeight: touchTarget,
    minWidth: touchTarget,
    margin: -hairline,
    paddingTop: 0,
    paddingBottom: 0,
    paddingLeft: space.sm,
    paddingRight: space.sm,
    borderWidth: hairline,
    borderStyle: 'solid',
    borderRadius: radius.sm,
    fontFamily,
    fontSize: type.body.fontSize,
    cursor: 'pointer',
  }),
  chosen: { fontWeight: weight.strong },
  fill: { alignSelf: 'stretch' },
  part: webStyle({ flex: 1, paddingLeft: space.xxs, paddingRight: space.xxs }),
});
