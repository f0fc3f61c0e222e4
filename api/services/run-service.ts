import { isDeepStrictEqual } from 'node:util';
import type { z } from 'zod';

import type { Run, runPutSchema, runsPatchedSchema, RunsPatch } from '@/api/contracts/run';
import type { Member } from '@/api/contracts/session';
import { AppError } from '@/api/errors';
import type { Behind, WithFirm } from '@/db/with-firm';

import { allow } from './allow';
import { refuse, under, type Fields } from './field-problems';
import { holdJob, noSuchJob } from './job-rows';
import { knownTo, numberFields, runFields } from './run-checks';

type RunPut = z.infer<typeof runPutSchema>;
type RunsPatched = z.infer<typeof runsPatchedSchema>;
/** Runs by id, as they are stored. */
type Stored = ReadonlyMap<string, Run>;

const most = 500;

export function createRunService({ withFirm }: { withFirm: WithFirm }) {
  return {
    list(member: Member, job: string): Promise<{ runs: Run[] }> {
      allow(member, 'see-jobs');
      return withFirm(member.firmId, async ({ jobs, runs }) => {
        if (!(await jobs.exists(job))) throw noSuchJob();
        return { runs: await runs.list(job) };
      });
    },
    /**
     * Puts and drops runs, all of them or none.
     *
     * @throws AppError `stale` with only the rows that somebody else changed, as they are now
     */
    patch(member: Member, job: string, batch: RunsPatch): Promise<RunsPatched> {
      allow(member, 'edit-jobs');
      return withFirm(member.firmId, async (behind) => {
        await holdJob(behind, job);
        refuse(batchFields(batch));
        const stored = await storedOf(behind, job, batch);
        refuseStale(batch, stored);
        refuse(await unknownFields(behind, job, { batch, stored }));
        refuse(await contentFields(behind, job, batch));
        return write(behind, job, { batch, stored });
      });
    },
  };
}
export type RunService = ReturnType<typeof createRunService>;

async function storedOf({ runs }: Behind, job: string, { put, drop }: RunsPatch): Promise<Stored> {
  const found = await runs.among(
    job,
    [...put, ...drop].map(({ id }) => id),
  );
  return new Map(found.map((run) => [run.id, run]));
}

/** One batch names each run once, and not too many. */
function batchFields({ put, drop }: RunsPatch): Fields {
  if (put.length + drop.length > most) return { put: `At most ${most} runs at once` };
  const seen = new Set<string>();
  const fields: Fields = {};
  const paths = [...put.map((_, index) => `put.${index}`), ...drop.map((_, index) => `drop.${index}`)];
  [...put, ...drop].forEach(({ id }, index) => {
    if (seen.has(id)) fields[`${paths[index]}.id`] = 'Stands in this batch already';
    seen.add(id);
  });
  return fields;
}

/** A new run whose id is stored with the same content was sent twice: its first answer was lost. */
const isRetry = (put: RunPut, stored: Run | undefined): boolean =>
  put.version === null && stored !== undefined && isDeepStrictEqual({ ...put, version: stored.version }, stored);

function refuseStale({ put, drop }: RunsPatch, stored: Stored): void {
  const changed = [...put.filter((run) => !isRetry(run, stored.get(run.id))), ...drop];
  const current = changed.flatMap(({ id, version }) => {
    const run = stored.get(id);
    return run && run.version !== version ? [run] : [];
  });
  if (current.length > 0) throw new AppError('stale', undefined, { current });
}

async function unknownFields(
  { runs }: Behind,
  job: string,
  { batch: { put, drop }, stored }: { batch: RunsPatch; stored: Stored },
): Promise<Fields> {
  const made = put.filter(({ id, version }) => version === null && !stored.has(id)).map(({ id }) => id);
  const elsewhere = made.length > 0 ? await runs.elsewhere(job, made) : new Set<string>();
  const fields: Fields = {};
  put.forEach(({ id, version }, index) => {
    if (elsewhere.has(id)) fields[`put.${index}.id`] = 'Another job has a run with this id';
    else if (version !== null && !stored.has(id)) fields[`put.${index}.id`] = 'This run does not exist';
  });
  drop.forEach(({ id }, index) => {
    if (!stored.has(id)) fields[`drop.${index}.id`] = 'This run does not exist';
  });
  return fields;
}

async function contentFields(behind: Behind, job: string, { put, drop }: RunsPatch): Promise<Fields> {
  if (put.length === 0) return {};
  const known = await knownTo(behind, job);
  const named = new Set([...put, ...drop].map(({ id }) => id));
  const others = (await behind.runs.numbers(job)).filter(({ id }) => !named.has(id));
  const contents = put.map((run, index) => under(`put.${index}`, runFields(run, known)));
  return Object.assign(numberFields(put, others), ...contents);
}

async function write(
  { runs }: Behind,
  job: string,
  { batch: { put, drop }, stored }: { batch: RunsPatch; stored: Stored },
): Promise<RunsPatched> {
  const dropped = drop.map(({ id }) => id);
  const changed = put.filter((run) => !isRetry(run, stored.get(run.id)));
  await runs.remove(job, dropped);
  const saved = await runs.save(
    job,
    changed.map((run) => ({ ...run, version: run.version ?? 0 })),
  );
  if (saved.length !== changed.length) throw new AppError('conflict');
  const byId = new Map([...stored.values(), ...saved].map((run) => [run.id, run]));
  return { put: put.flatMap(({ id }) => byId.get(id) ?? []), dropped };
}
