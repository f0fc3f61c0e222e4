import Svg from 'react-native-svg';

import { section, type SectionInput } from '@/api/geometry/section';

import { SectionPaths } from './section-paths';

type SectionProps = {
  /** what is cut, in m: a schedule row's `section`, or put together from a judged run */
  drawn: SectionInput;
  /** side of the square: 28 beside a run, 40 in a schedule, 120 on a card, 280 in a study */
  size: 28 | 40 | 120 | 280;
  /** what it shows; left out where the words beside it say the same */
  label?: string;
};

/** The cut pipe, duct or wall, to scale. */
export function Section({ drawn, size, label }: SectionProps) {
  const drawing = section(drawn, size);
  const said = label ? { role: 'img' as const, 'aria-label': label } : { 'aria-hidden': true };
  return (
    <Svg {...said} width={size} height={size} viewBox={`0 0 ${size} ${size}`}>
      <SectionPaths drawing={drawing} />
    </Svg>
  );
}
