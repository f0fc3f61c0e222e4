import { wordsText, type Words } from '@/api/contracts/words-text';
import { useUnits } from '@/hooks/use-units';

import { unbroken } from './unbroken';

/** A sentence of the engine, in the person's units; it takes size and colour from the Text around it. */
export function EngineWords({ words }: { words: Words }) {
  const { units } = useUnits();
  return unbroken(wordsText(words, units));
}
