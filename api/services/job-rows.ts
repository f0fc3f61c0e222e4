import type { Member } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { JobRows, RowSeen } from '@/db/repositories/job-rows';
import type { Behind, WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { refuse, type Fields } from './field-problems';

type Stored = { id: string; version: number };
export type RowOfJob = { job: string; id: string };
export type Uses = [count: number, one: string, more: string][];
type Written<Input> = { job: string; input: Input };

/** What is particular to one noun that hangs on a job. */
type Kind<Input, Row> = {
  noun: string;
  rows: (behind: Behind) => JobRows<Input, Row>;
  /** what no two rows of a job may share, and the field that says so */
  unique?: { field: string; of: (row: Input | Row) => string | number };
  check?: (behind: Behind, written: Written<Input>) => Promise<Fields> | Fields;
  uses?: (behind: Behind, row: RowOfJob) => Promise<Uses>;
};

/** @throws AppError `not-found` when this firm has no such job */
export async function holdJob({ jobs }: Behind, job: string): Promise<void> {
  if (!(await jobs.hold(job))) throw noSuchJob();
}
export const noSuchJob = () => new AppError('not-found', 'This job does not exist');

/** List, create, change and remove: the same rules for each noun that hangs on a job. */
export function createJobRowService<Input, Row extends Input & Stored>(
  withFirm: WithFirm,
  kind: Kind<Input, Row>,
): JobRowService<Input, Row> {
  const edit = <Result>(member: Member, job: string, work: (behind: Behind) => Promise<Result>): Promise<Result> => {
    allow(member, 'edit-jobs');
    return withFirm(member.firmId, async (behind) => {
      await holdJob(behind, job);
      return work(behind);
    });
  };

  async function check(behind: Behind, { job, input }: Written<Input>, id?: string): Promise<void> {
    const taken = kind.unique ? await takenField(behind, { job, input }, id) : {};
    refuse({ ...taken, ...(await kind.check?.(behind, { job, input })) });
  }

  async function takenField(behind: Behind, { job, input }: Written<Input>, id?: string): Promise<Fields> {
    const { field, of } = kind.unique!;
    const others = await kind.rows(behind).list(job);
    const taken = others.some((row) => row.id !== id && of(row) === of(input));
    return taken ? { [field]: `Another ${kind.noun} of this job has it already` } : {};
  }

  async function current(behind: Behind, { job, id }: RowOfJob, version: number): Promise<Row> {
    const row = await kind.rows(behind).find(job, id);
    if (!row) throw new AppError('not-found', `This ${kind.noun} does not exist`);
    if (row.version !== version) throw new AppError('stale', undefined, { current: row });
    return row;
  }

  return {
    list(member: Member, job: string): Promise<Row[]> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, async (behind) => {
        if (!(await behind.jobs.exists(job))) throw noSuchJob();
        return kind.rows(behind).list(job);
      });
    },
    create: (member: Member, job: string, input: Input): Promise<Row> =>
      edit(member, job, async (behind) => {
        await check(behind, { job, input });
        return kind.rows(behind).insert(job, input);
      }),
    /** @throws AppError `stale` with the row as it is now */
    change: (member: Member, { job, id }: RowOfJob, input: Input & { version: number }): Promise<Row> =>
      edit(member, job, async (behind) => {
        await current(behind, { job, id }, input.version);
        await check(behind, { job, input }, id);
        return must(await kind.rows(behind).update(job, { id, version: input.version }, input));
      }),
    /** @throws AppError `conflict` when something in the job still uses the row */
    remove: (member: Member, job: string, { id, version }: RowSeen): Promise<void> =>
      edit(member, job, async (behind) => {
        await current(behind, { job, id }, version);
        const uses = (await kind.uses?.(behind, { job, id })) ?? [];
        const words = usesWords(uses, kind.noun);
        if (words) throw new AppError('conflict', words);
        await kind.rows(behind).remove(job, { id, version });
      }),
  };
}

export type JobRowService<Input, Row> = {
  list(member: Member, job: string): Promise<Row[]>;
  create(member: Member, job: string, input: Input): Promise<Row>;
  change(member: Member, row: RowOfJob, input: Input & { version: number }): Promise<Row>;
  remove(member: Member, job: string, seen: RowSeen): Promise<void>;
};

/** "3 runs and 1 build-up use this place"; empty when nothing does. */
export function usesWords(uses: Uses, noun: string): string {
  const used = uses.filter(([count]) => count > 0);
  const parts = used.map(([count, one, more]) => `${count} ${count === 1 ? one : more}`);
  if (parts.length === 0) return '';
  const last = parts.pop();
  const verb = used.length === 1 && used[0]![0] === 1 ? 'uses' : 'use';
  return `${parts.length > 0 ? `${parts.join(', ')} and ` : ''}${last} ${verb} this ${noun}`;
}

/** The job is held, so a row that was there a moment ago still is. */
export function must<Row>(row: Row | undefined): Row {
  if (!row) throw new AppError('conflict');
  return row;
}
