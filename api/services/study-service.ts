import type { JobData } from '@/api/contracts/job-data';
import type { Judgement } from '@/api/contracts/judgement';
import type { Schedule, Takeoff } from '@/api/contracts/schedule';
import type { Member } from '@/api/contracts/session';
import type { RunStudy, Working, WorkingAsked } from '@/api/contracts/study';
import { working } from '@/api/engine/limits/working';
import { AppError } from '@/api/errors';
import type { WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { noSuchJob } from './job-rows';
import type { Judged } from './judged';
import { judge, judgementOf, runStudy } from './judging';
import { scheduleOf } from './scheduling';
import { takeoffOf } from './taking-off';

/** What follows from a job's rows: worked out at each request, stored never. */
export function createStudyService({ withFirm }: { withFirm: WithFirm }) {
  async function load(member: Member, job: string): Promise<JobData> {
    allow(member, 'see-jobs');
    const data = await withFirm(member.firmId, ({ jobData }) => jobData.load(job));
    if (!data) throw noSuchJob();
    return data;
  }

  async function judgeOne(member: Member, job: string, runId: string): Promise<Judged> {
    const data = await load(member, job);
    const runs = data.runs.filter(({ id }) => id === runId);
    const judged = judge({ ...data, runs })[0];
    if (!judged) throw new AppError('not-found', 'This run does not exist');
    return judged;
  }

  return {
    judgement: async (member: Member, job: string): Promise<Judgement> => judgementOf(judge(await load(member, job))),
    /** @throws AppError `cannot-calculate` when the run has no study, saying why */
    async study(member: Member, job: string, run: string): Promise<RunStudy> {
      const judged = await judgeOne(member, job, run);
      const study = runStudy(judged);
      if (!study) throw noStudy(judged);
      return study;
    },
    /** @throws AppError `cannot-calculate` when the run has no study; EngineError when it has no such thickness or limit */
    async working(member: Member, { job, run }: { job: string; run: string }, asked: WorkingAsked): Promise<Working> {
      const judged = await judgeOne(member, job, run);
      const { input, study, used } = judged;
      if (!input || !study) throw noStudy(judged);
      const shown = used ? study.candidates.indexOf(used) : study.candidates.length - 1;
      return working(input, { ...asked, candidate: asked.candidate ?? shown });
    },
    async schedule(member: Member, job: string): Promise<Schedule> {
      const data = await load(member, job);
      return scheduleOf(data, judge(data));
    },
    async takeoff(member: Member, job: string): Promise<Takeoff> {
      const data = await load(member, job);
      return takeoffOf(data, judge(data));
    },
  };
}
export type StudyService = ReturnType<typeof createStudyService>;

function noStudy({ run, assembled, problem }: Judged): AppError {
  if (problem !== null) return new AppError('cannot-calculate', problem);
  if (!assembled) return new AppError('cannot-calculate', 'No row of the specification and no build-up fits this run');
  return new AppError('cannot-calculate', `${run.number} is counted, it has no shape to calculate`);
}
