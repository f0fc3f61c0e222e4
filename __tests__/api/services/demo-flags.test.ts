import { judge, judgementOf } from '@/api/services/judging';
import { demoInMemory } from '@/db/seeds/demo/in-memory';

import expected from './demo/expected-flags.json';

type Expected = {
  run: string;
  kind: string;
  margin?: number;
  state?: string;
  meetsBy?: { thickness: string; margin: number } | null;
};
// K for touch and dew point, m for the code row
const tolerance = (kind: string) => (kind === 'energy-code' ? 0.0001 : 0.2);

async function flagsOf(state: 'revision-a' | 'addendum-1') {
  const data = await demoInMemory(state);
  const numbers = new Map(data.runs.map(({ id, number }) => [id, number]));
  return judgementOf(judge(data))
    .runs.flatMap(({ flags }) => flags)
    .map((flag) => ({ ...flag, run: numbers.get(flag.runId)! }));
}

const byName = (flags: { run: string; kind: string }[]) => flags.map(({ run, kind }) => `${run} ${kind}`).toSorted();

describe.each([
  ['as it stands with Addendum 1', 'addendum-1' as const, expected.withAddendum1],
  ['as Revision A was sent', 'revision-a' as const, expected.revisionA],
])('the invented demo job %s', (_title, state, listed) => {
  const expectedFlags: Expected[] = listed;

  it('has exactly the flags listed, run by run, and no others', async () => {
    expect(byName(await flagsOf(state))).toEqual(byName(expectedFlags));
  });

  it('has their margins and states, and what would meet each limit', async () => {
    const flags = await flagsOf(state);
    for (const { run, kind, margin, state: dryness, meetsBy } of expectedFlags) {
      const flag = flags.find((candidate) => candidate.run === run && candidate.kind === kind)!;
      if (kind === 'hold') continue;
      expect([run, kind, Math.abs(flag.verdict!.margin! - margin!) <= tolerance(kind)]).toEqual([run, kind, true]);
      expect([run, flag.verdict!.state]).toEqual([run, dryness ?? null]);
      if (meetsBy === undefined) continue;
      expect([run, kind, flag.meetsBy?.thickness ?? null]).toEqual([run, kind, meetsBy?.thickness ?? null]);
      if (meetsBy) expect(Math.abs(flag.meetsBy!.margin! - meetsBy.margin)).toBeLessThanOrEqual(tolerance(kind));
    }
  });
});
