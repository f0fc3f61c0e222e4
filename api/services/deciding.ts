import type { Flag } from '@/api/contracts/judgement';
import { flagWords, limitWords } from '@/api/contracts/run-words';
import { limitKinds, type LimitKind } from '@/api/engine/limits/study-types';
import { nominalThickness, type ThicknessName } from '@/api/engine/standards/thickness-name';
import type { Words } from '@/api/engine/words';

import { flagsOf } from './flagging';
import { groupBy } from './insulated-alike';
import type { Judged } from './judged';

/** What decides a line of the schedule: the limits that fall short, else the one that governs. */
export function decidesWords(group: readonly Judged[]): Words {
  const short = shortfalls(group);
  const sentences = short.length > 0 ? short : standing(group);
  return sentences.flatMap((sentence, place) => (place === 0 ? sentence : [' ', ...sentence]));
}

/** "Energy code not met (R19, R20): 114 mm meets it." */
function shortfalls(group: readonly Judged[]): Words[] {
  const flagged = group.flatMap((item) =>
    flagsOf(item).flatMap((flag) => (flag.verdict ? [{ number: item.run.number, flag }] : [])),
  );
  const alike = groupBy(flagged, ({ flag }) => `${flag.kind} ${flag.verdict?.verdict} ${flag.meetsBy?.thickness}`);
  return [...alike.values()].map((flags) => {
    const numbers = flags.map(({ number }) => number);
    const { flag } = flags[0]!;
    const which = numbers.length === group.length ? '' : ` (${numbers.join(', ')})`;
    return [`${capital(flagWords[flag.kind])} ${verdictWords(flag)}${which}`, ...remedy(flag)];
  });
}

const verdictWords = ({ verdict }: Flag) => (verdict?.verdict === 'cannot-tell' ? 'cannot be told' : 'not met');

function remedy({ verdict, meetsBy }: Flag): Words {
  if (verdict?.verdict === 'cannot-tell') return ['.'];
  return meetsBy
    ? [': ', { thickness: [meetsBy.thickness] }, ' meets it.']
    : ['; no made thickness with this finish meets it.'];
}

/** All limits are met: what governs, and where less would do. */
function standing(group: readonly Judged[]): Words[] {
  const solved = group.flatMap(({ study, used }) => (study && used ? [{ study, used }] : []));
  const proposals = solved.map(({ study: { proposed, candidates } }) =>
    proposed === null ? null : (candidates[proposed] ?? null),
  );
  const thinner = proposals.flatMap((candidate, place) =>
    candidate?.name && candidate !== solved[place]?.used ? [candidate.name] : [],
  );
  const governing = limitKinds.filter((kind) => solved.some(({ study }) => study.governing === kind));
  return [...governs(governing), ...(thinner.length > 0 ? [lessWouldDo(thinner)] : [])];
}

function governs(kinds: readonly LimitKind[]): Words[] {
  if (kinds.length === 0) return [['Every limit is met.']];
  return [
    [`${capital(kinds.map((kind) => limitWords[kind]).join(' and '))} ${kinds.length > 1 ? 'govern' : 'governs'}.`],
  ];
}

/** Specified or chosen thicker than the limits ask: by how much stands in the study. */
function lessWouldDo(names: readonly ThicknessName[]): Words {
  const sorted = [...new Set(names)].toSorted((one, other) => nominalThickness(one) - nominalThickness(other));
  const [thinnest, thickest] = [sorted[0]!, sorted.at(-1)!];
  const range: Words =
    thinnest === thickest
      ? [{ thickness: [thinnest] }]
      : [{ thickness: [thinnest] }, ' to ', { thickness: [thickest] }];
  return [...range, ' would meet every limit.'];
}

const capital = (text: string) => text.charAt(0).toUpperCase() + text.slice(1);
