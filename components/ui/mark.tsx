import type { TypeSize } from '@/components/theme/tokens';

import { Text, Words } from './text';

export type Verdict = 'pass' | 'caution' | 'fail' | 'none';

const signs: Record<Verdict, string> = { pass: '✓', caution: '!', fail: '✗', none: '–' };
const tones = { pass: 'pass', caution: 'caution', fail: 'fail', none: 'inkSoft' } as const;

type MarkProps = {
  verdict: Verdict;
  /** "meets all", "touch, code", "0.3 K dry": never the colour alone */
  words: string;
  size?: TypeSize;
  strong?: boolean;
  align?: 'left' | 'right' | 'center';
};

/** A verdict as a sign and its words. */
export function Mark({ verdict, words, size = 'small', strong = false, align }: MarkProps) {
  return (
    <Text size={size} tone={tones[verdict]} weight={strong ? 'strong' : 'regular'} align={align}>
      <Words decorative noWrap>
        {`${signs[verdict]}\u00a0`}
      </Words>
      {words}
    </Text>
  );
}
