import type { JudgedRun } from '@/api/contracts/judgement';
import { flagWords } from '@/api/contracts/run-words';
import type { Verdict } from '@/components/ui/mark';

export type RunVerdict = { verdict: Verdict; words: string };

/** A run's verdict in a list: the limits it fails, what is marginal, or that it meets all. */
export function runVerdict(judged: JudgedRun | undefined): RunVerdict {
  if (!judged) return { verdict: 'none', words: 'judging' };
  if (judged.flags.length === 0) return judged.assembly ? { verdict: 'pass', words: 'meets all' } : nothing;
  const words = judged.flags.map(({ kind, verdict }) => stateWords[verdict?.state ?? ''] ?? flagWords[kind]);
  const isMild = judged.flags.every(({ kind, verdict }) => verdict?.state === 'marginal' || kind === 'hold');
  return { verdict: isMild ? 'caution' : 'fail', words: [...new Set(words)].join(', ') };
}

const nothing: RunVerdict = { verdict: 'none', words: 'not judged' };
const stateWords: Partial<Record<string, string>> = { sweats: 'sweats', marginal: 'dew point, marginal' };
