import { useLayoutEffect, useRef, useState, type KeyboardEvent } from 'react';
import { StyleSheet, View } from 'react-native';

import { unitLabel } from '@/api/contracts/quantities';
import { placeNames } from '@/api/geometry/level-names';
import { strip, type StripLayout } from '@/api/geometry/strip';
import { StripPlot } from '@/components/diagram/strip-plot';
import { space } from '@/components/theme/tokens';
import { useLayout } from '@/components/theme/use-layout';
import { webStyle } from '@/components/theme/web-style';
import { Element } from '@/components/ui/element';
import { useUnits } from '@/hooks/use-units';

import { candidateName, heatKind, heatText } from './candidate-words';
import { standingWords, type Standing } from './put-up';
import { headroom, StripColumn } from './strip-column';
import { columnText, levelText, stripFacts, type StripFacts } from './strip-facts';
import { gutters, LevelNames, StripAxis, type NamedLevel } from './strip-frame';
import { placeAfter } from './strip-keys';
import type { StudiedRun } from './study-facts';

type ThicknessStripProps = {
  runStudy: StudiedRun;
  standing: Standing;
  selected: number;
  onSelect: (place: number) => void;
};

/** Columns that do not all fit scroll, and then need not be narrow. */
const scrolling = 78;
const rooms = {
  phone: { least: 128, plot: 132, tallest: 112 },
  wide: { least: 64, plot: 200, tallest: 84 },
};

/** Every thickness that is made, growing from left to right on one base line; one of them is selected. */
export function ThicknessStrip({ runStudy, standing, selected, onSelect }: ThicknessStripProps) {
  const { isPhone } = useLayout();
  const { units } = useUnits();
  const left = isPhone ? 0 : gutters[units];
  const [width, setWidth] = useState(isPhone ? 358 : 800);
  const facts = stripFacts(runStudy, units);
  const room = { width: width - left, ...rooms[isPhone ? 'phone' : 'wide'] };
  const fits = room.width / runStudy.study.candidates.length >= room.least;
  const layout = strip(facts.input, { ...room, least: fits ? room.least : Math.max(room.least, scrolling) });
  const heatUnit = unitLabel(heatKind(runStudy.study.candidates[0]), units);
  return (
    <View style={styles.whole} onLayout={({ nativeEvent }) => setWidth(nativeEvent.layout.width)}>
      {isPhone ? null : (
        <StripAxis layout={layout} width={left} unit={unitLabel('temperature', units)} heatUnit={heatUnit} />
      )}
      <View style={{ marginLeft: left }}>
        <Columns {...{ runStudy, standing, selected, onSelect, layout, facts }} />
        <LevelNames levels={namedLevels(facts, { layout, units, isPhone })} />
      </View>
    </View>
  );
}

type ColumnsProps = ThicknessStripProps & { layout: StripLayout; facts: StripFacts };

function Columns({ runStudy, standing, selected, onSelect, layout, facts }: ColumnsProps) {
  const { isPhone } = useLayout();
  const { units } = useUnits();
  const scroll = useRef<HTMLDivElement>(null);
  const { candidates } = runStudy.study;
  useLayoutEffect(() => reveal(scroll.current, (selected + 0.5) * layout.pitch), [selected, layout.pitch]);
  const walk = (event: KeyboardEvent) => {
    const place = placeAfter(event.key, { at: selected, count: candidates.length });
    if (place === null) return;
    event.preventDefault();
    onSelect(place);
    scroll.current?.querySelectorAll<HTMLElement>('[role="radio"]')[place]?.focus({ preventScroll: true });
  };
  const above = Math.min(...layout.columns.map(({ drawing, drawingTop }) => drawingTop + drawing.box.y)) - headroom;
  const inks = Object.fromEntries(facts.curves.map(({ id, ink }) => [id, ink]));
  const digits = units === 'SI' || facts.levels.some(({ kind }) => kind === 'dew-point') ? 1 : 0;
  return (
    <Element tag="div" ref={scroll} style={styles.scroll}>
      <View style={{ width: layout.width }}>
        <View style={styles.plot}>
          <StripPlot
            layout={layout}
            inks={inks}
            selected={selected}
            text={(value) => value.toFixed(digits).replace('-', '−')}
          />
        </View>
        <View role="radiogroup" aria-label="Thickness" style={[styles.row, { marginTop: above }]}>
          {candidates.map((candidate, place) => (
            <StripColumn
              key={candidate.names.join() || 'bare'}
              placed={layout.columns[place]!}
              base={layout.base - above}
              above={above}
              pitch={layout.pitch}
              candidate={candidate}
              name={candidateName(candidate, units)}
              heat={isPhone ? heatText(candidate, units) : heatNumber(heatText(candidate, units))}
              words={standingWords(standing, place)}
              said={columnText(place, { runStudy, standing, units })}
              selected={place === selected}
              onSelect={() => onSelect(place)}
              onKeyDown={walk}
            />
          ))}
        </View>
      </View>
    </Element>
  );
}

/** The unit stands once, at the left. */
const heatNumber = (text: string) => text.replace(/ .*/, '');

/** Brings a place of the strip to the middle of what is in view; what fits as a whole does not move. */
function reveal(scroll: HTMLDivElement | null, x: number): void {
  if (scroll) scroll.scrollLeft = x - scroll.clientWidth / 2;
}

type Named = { layout: StripLayout; units: Parameters<typeof levelText>[1]; isPhone: boolean };

/** A touch limit is named where the curve has left it behind, a dew point where it has not come up to it; on a phone always at the thumb's other side. */
function namedLevels({ levels }: StripFacts, { layout, units, isPhone }: Named): NamedLevel[] {
  const texts = levels.map((level) => ({ id: level.id, text: levelText(level, units) }));
  const names = texts.map(({ id, text }) => ({ id, width: text.length * letter, end: endOf(id, isPhone) }));
  return placeNames(layout, names).map((placed, index) => ({
    ...placed,
    end: isPhone ? 'left' : placed.end,
    text: texts[index]?.text ?? '',
  }));
}

/** About how wide a letter of a name is. */
const letter = 6.8;
const endOf = (id: string, isPhone: boolean) => (isPhone || id !== 'touch' ? ('left' as const) : ('right' as const));

const styles = StyleSheet.create({
  whole: { minWidth: 0 },
  scroll: webStyle({ overflowX: 'auto', overflowY: 'hidden', scrollSnapType: 'x proximity', paddingBottom: space.xxs }),
  plot: webStyle({ position: 'absolute', left: 0, top: 0, pointerEvents: 'none' }),
  row: { flexDirection: 'row', alignItems: 'stretch' },
});
