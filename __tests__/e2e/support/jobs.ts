import type { APIRequestContext } from '@playwright/test';
import { z } from 'zod';

import { jobSchema, jobSummarySchema, type Job, type JobInput } from '@/api/contracts/job';
import { runSchema, runsPatchedSchema, type Run } from '@/api/contracts/run';
import { rowSchema } from '@/api/contracts/text';

import { ask, write } from './api';

/** A job with the runs that a test needs, by their numbers. */
export type TestJob = { job: Job; path: string; run: (number: string) => Run };

/** The demo's first job, which tests read and leave as it is. */
export async function demoJob(request: APIRequestContext): Promise<TestJob> {
  const jobs = await ask(request, '/jobs', jobSummarySchema.array());
  const found = jobs.find(({ number }) => number === 'BLI-0417');
  if (!found) throw new Error('The demo job is not there');
  return withRuns(request, await ask(request, `/jobs/${found.id}`, jobSchema));
}

/** A job with nothing in it. */
export async function emptyJob(request: APIRequestContext): Promise<Job> {
  return newJob(request, await demoJob(request), {
    scope: '',
    contactIds: [],
    bidDue: null,
    specification: { number: '', title: '', revision: '', date: null },
  });
}

/**
 * A job of the test's own: some of the demo's runs with all that they stand on, entered through the same requests as
 * the screens make. What is done to it reaches no other test.
 */
export async function copyOfDemo(request: APIRequestContext, numbers: readonly string[]): Promise<TestJob> {
  const demo = await demoJob(request);
  const runs = numbers.map(demo.run);
  const job = await newJob(request, demo, {});
  const ids = new Map<string, string>();
  const copyList = async (name: string, isWanted: (row: Row) => boolean) => {
    const rows = (await ask(request, `/jobs/${demo.job.id}/${name}`, rowsSchema)).filter(isWanted);
    const copied = await Promise.all(
      rows.map((row) =>
        write(request, { path: `/jobs/${job.id}/${name}`, body: withIds(row, ids), schema: rowSchema }),
      ),
    );
    rows.forEach(({ id }, index) => ids.set(id, copied[index]?.id ?? ''));
  };
  const ofRuns = (key: 'levelId' | 'drawingId' | 'serviceId') => (row: Row) => runs.some((run) => run[key] === row.id);
  const ofServices = ({ serviceId }: Row) => runs.some((run) => run.serviceId === serviceId);
  await copyList('levels', ofRuns('levelId'));
  await copyList('drawings', ofRuns('drawingId'));
  await copyList('places', () => true);
  await copyList('services', ofRuns('serviceId'));
  await copyList('specification', ofServices);
  await copyList('build-ups', ofServices);
  const put = runs.map((run) => ({ ...withIds(run, ids), id: crypto.randomUUID(), version: null }));
  const body = { put, drop: [] };
  await write(request, { method: 'PATCH', path: `/jobs/${job.id}/runs`, body, schema: runsPatchedSchema });
  return withRuns(request, job);
}

const rowsSchema = z.array(z.looseObject({ id: z.string(), serviceId: z.string().optional() }));
type Row = z.infer<typeof rowsSchema>[number];

/** The same row with the ids of the copy in it. */
function withIds({ id: _id, version: _version, ...row }: Record<string, unknown>, ids: ReadonlyMap<string, string>) {
  const text = [...ids].reduce((body, [before, now]) => body.replaceAll(before, now), JSON.stringify(row));
  return z.looseObject({}).parse(JSON.parse(text));
}

async function newJob(request: APIRequestContext, demo: TestJob, change: Partial<JobInput>): Promise<Job> {
  const { id: _id, version: _version, ...input } = demo.job;
  const mark = crypto.randomUUID().slice(0, 8);
  const body = { ...input, number: `TST-${mark}`, name: `Boiler house ${mark}`, ...change };
  return write(request, { path: '/jobs', body, schema: jobSchema });
}

const runsSchema = z.object({ runs: runSchema.array() });

async function withRuns(request: APIRequestContext, job: Job): Promise<TestJob> {
  const { runs } = await ask(request, `/jobs/${job.id}/runs`, runsSchema);
  const run = (number: string): Run => {
    const found = runs.find((one) => one.number === number);
    if (!found) throw new Error(`${job.number} has no run ${number}`);
    return found;
  };
  return { job, path: `/jobs/${job.id}`, run };
}
