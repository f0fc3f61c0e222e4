import type { JobData } from '@/api/contracts/job-data';
import type { Snapshot } from '@/api/contracts/revision';
import type { Firm, Member } from '@/api/contracts/session';
import { cautionsFor } from '@/api/documents/takeoff/cautions';
import { engineVersion } from '@/api/engine/version';

import { flagsOf } from './flagging';
import { judge, toJudgedRun } from './judging';
import { scheduleOf } from './scheduling';
import { takeoffOf } from './taking-off';
import { usedStandards } from './used-standards';

/** How a revision is named and dated; a draft has none of it. */
export type Issue = { letter: string | null; frozenAt: Date | null; validUntil: string | null };
type Taken = { data: JobData; firm: Firm; member: Pick<Member, 'name' | 'email'>; issue: Issue };

/** All that a document says, worked out once: inputs, results, texts and the standards that they rest on. */
export function takeSnapshot({ data, firm, member, issue }: Taken): Snapshot {
  const { job, contacts } = data;
  const judged = judge(data);
  const results = judged.map(toJudgedRun);
  const materialNames = results.flatMap(
    ({ assembly }) => assembly?.layers.map(({ materialName }) => materialName) ?? [],
  );
  return {
    format: 1,
    letter: issue.letter,
    frozenAt: issue.frozenAt?.toISOString() ?? null,
    validUntil: issue.validUntil,
    timeZone: zoneOf(data, firm),
    preparedBy: { name: member.name, email: member.email },
    letterhead: letterheadOf(firm),
    to: contacts.map(({ name, company, email }) => ({ name, company, email })),
    job,
    levels: data.levels,
    drawings: data.drawings,
    addenda: data.addenda,
    places: data.places,
    services: data.services,
    runs: data.runs,
    judged: results,
    flags: judged.flatMap(flagsOf),
    schedule: scheduleOf(data, judged),
    takeoff: takeoffOf(data, judged),
    cautions: cautionsFor({ services: data.services, places: data.places, runs: data.runs, materialNames }),
    standards: usedStandards(judged, job.codeEdition),
    engineVersion,
    method: job.surfaceMethod,
  };
}

/** The job's own zone where its bid names one, else the firm's. */
export const zoneOf = ({ job }: Pick<JobData, 'job'>, { timeZone }: Pick<Firm, 'timeZone'>): string =>
  job.bidDue?.zone ?? timeZone;

const letterheadOf = (firm: Firm): Snapshot['letterhead'] => ({
  name: firm.name,
  town: firm.town,
  address: firm.address,
  email: firm.email || firm.recordAddress,
  phone: firm.phone,
  locale: firm.locale,
  currency: firm.currency,
});
