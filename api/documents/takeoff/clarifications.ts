import { flagWords } from '@/api/contracts/run-words';
import type { FlagKind } from '@/api/contracts/judgement';
import type { Snapshot } from '@/api/contracts/revision';
import type { Words } from '@/api/engine/words';

import { numberRanges } from './number-ranges';

/** Flags as a reader meets them: numbered, one for each limit of a service, equal sentences of several runs once. */
export type Clarification = {
  number: number;
  title: string;
  entries: { runs: string; words: Words }[];
  runIds: Set<string>;
};

type Flagged = { runId: string; runNumber: string; service: string; kind: FlagKind; words: Words };

export function clarificationsOf(snapshot: Pick<Snapshot, 'flags' | 'runs' | 'services'>): Clarification[] {
  const groups = groupedBy(flagged(snapshot), ({ kind, service }) => `${kind} ${service}`);
  return groups.map((flags, index) => ({
    number: index + 1,
    title: `${flags[0]!.service}: ${flagWords[flags[0]!.kind]}`,
    entries: groupedBy(flags, ({ words }) => JSON.stringify(words)).map((same) => ({
      runs: numberRanges(same.map(({ runNumber }) => runNumber)),
      words: same[0]!.words,
    })),
    runIds: new Set(flags.map(({ runId }) => runId)),
  }));
}

function flagged({ flags, runs, services }: Pick<Snapshot, 'flags' | 'runs' | 'services'>): Flagged[] {
  const runById = new Map(runs.map((run) => [run.id, run]));
  const serviceById = new Map(services.map((service) => [service.id, service.name]));
  return flags.map(({ runId, kind, words }) => {
    const run = runById.get(runId);
    return { runId, kind, words, runNumber: run?.number ?? '', service: serviceById.get(run?.serviceId ?? '') ?? '' };
  });
}

function groupedBy<Item>(items: Item[], key: (item: Item) => string): Item[][] {
  const groups = new Map<string, Item[]>();
  for (const item of items) {
    const group = groups.get(key(item));
    if (group) group.push(item);
    else groups.set(key(item), [item]);
  }
  return [...groups.values()];
}

/** Numbers of the clarifications that concern these runs. */
export const numbersFor = (clarifications: readonly Clarification[], runIds: readonly string[]): number[] =>
  clarifications.filter(({ runIds: concerned }) => runIds.some((id) => concerned.has(id))).map(({ number }) => number);

export const destinationOf = (number: number): string => `clarification-${number}`;
