import type { Flag } from '@/api/contracts/judgement';
import {
  limitKinds,
  type Candidate,
  type LimitKind,
  type LimitVerdict,
  type Study,
} from '@/api/engine/limits/study-types';
import type { Words } from '@/api/engine/words';

import { limitFlagWords } from './flag-words';
import type { Judged } from './judged';

/** Everything about a run that a person must look at before it goes out. */
export function flagsOf(judged: Judged): Flag[] {
  return [...limitFlags(judged), ...otherFlags(judged)];
}

function otherFlags({ run, assembled, problem }: Judged): Flag[] {
  const flag = (kind: Flag['kind'], text: string): Flag => ({
    runId: run.id,
    kind,
    verdict: null,
    meetsBy: null,
    words: [text],
  });
  const flags: Flag[] = [];
  if (!assembled) flags.push(flag('not-specified', 'No row of the specification and no build-up fits this run.'));
  if (problem !== null) flags.push(flag('not-calculated', `Cannot be calculated: ${problem}`));
  if (run.hold) flags.push(flag('hold', `On hold: ${run.hold.reason} (${run.hold.by}).`));
  return flags;
}

/** One flag for each limit that is not met or cannot be told: two states of a service count as the worse. */
function limitFlags({ run, study, used }: Judged): Flag[] {
  if (!study) return [];
  const judgedAt = used ?? study.candidates.at(-1);
  const kinds = used ? limitKinds : kindsNeverMet(study);
  return kinds.flatMap((kind) => {
    const verdict = judgedAt && worst(judgedAt, kind);
    if (!verdict || (verdict.verdict !== 'not-met' && verdict.verdict !== 'cannot-tell')) return [];
    const meeting = meetingCandidate(study, kind);
    const words: Words = limitFlagWords(verdict, meeting?.names ?? null);
    const subject: Words = used ? [] : [{ thickness: judgedAt.names }, ': '];
    return [
      { runId: run.id, kind, verdict, meetsBy: meeting && meetsBy(meeting, kind), words: [...subject, ...words] },
    ];
  });
}

/** Nothing made meets all: the limits that no thickness meets, else the one that stands in the way. */
function kindsNeverMet({ meets, governing }: Study): LimitKind[] {
  const never = meets.filter(({ candidate }) => candidate === null).map(({ kind }) => kind);
  return never.length > 0 || governing === null ? never : [governing];
}

function worst({ verdicts }: Candidate, kind: LimitKind): LimitVerdict | undefined {
  const failing = verdicts.filter(
    (verdict) => verdict.kind === kind && (verdict.verdict === 'not-met' || verdict.verdict === 'cannot-tell'),
  );
  return failing.toSorted((one, other) => (one.margin ?? 0) - (other.margin ?? 0))[0];
}

/** The thinnest made thickness that meets this one limit. */
function meetingCandidate({ meets, candidates }: Study, kind: LimitKind): Candidate | null {
  const place = meets.find((entry) => entry.kind === kind)?.candidate ?? null;
  const candidate = place === null ? undefined : candidates[place];
  return candidate?.name ? candidate : null;
}

function meetsBy(candidate: Candidate, kind: LimitKind): Flag['meetsBy'] {
  const margins = candidate.verdicts.flatMap((verdict) =>
    verdict.kind === kind && verdict.margin !== null ? [verdict.margin] : [],
  );
  return candidate.name && { thickness: candidate.name, margin: margins.length > 0 ? Math.min(...margins) : null };
}
