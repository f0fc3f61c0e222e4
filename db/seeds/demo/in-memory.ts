import { randomUUID } from 'node:crypto';

import type { AddendumInput, DrawingInput, LevelInput } from '@/api/contracts/basis';
import type { BuildUpInput, SpecificationRowInput } from '@/api/contracts/build-up';
import type { ContactInput } from '@/api/contracts/contact';
import type { JobInput } from '@/api/contracts/job';
import { jobDataSchema, type JobData } from '@/api/contracts/job-data';
import type { PlaceInput } from '@/api/contracts/place';
import type { RunInput, RunsPatch } from '@/api/contracts/run';
import type { ServiceInput } from '@/api/contracts/service';
import type { Member } from '@/api/contracts/session';

import { enterAddendum } from './addendum-1';
import { enterJob } from './enter-job';
import { demoEstimator } from './people';
import type { SeedServices } from './services-of-a-seed';

type Row = { id: string; version: number };

/** Rows of one noun, kept in the order in which they are entered. */
function noun<Input extends object>() {
  const rows: (Input & Row)[] = [];
  const add = (input: Input, id: string = randomUUID()) => {
    const row = { ...input, id, version: 1 };
    rows.push(row);
    return row;
  };
  const change = ({ id }: { id: string }, input: Input, version: number) => {
    const row = { ...input, id, version: version + 1 };
    const place = rows.findIndex((stored) => stored.id === id);
    rows.splice(place, 1, row);
    return row;
  };
  return { rows, add, create: async (_member: Member, _job: string, input: Input) => add(input), change };
}

function inMemory() {
  const jobs = noun<JobInput>();
  const contacts = noun<ContactInput>();
  const [levels, drawings, addenda] = [noun<LevelInput>(), noun<DrawingInput>(), noun<AddendumInput>()];
  const [places, service, buildUps] = [noun<PlaceInput>(), noun<ServiceInput>(), noun<BuildUpInput>()];
  const specification = noun<SpecificationRowInput>();
  const runs = noun<RunInput>();
  const patch = async (_member: Member, _job: string, { put }: RunsPatch) => {
    for (const { id, version: _new, ...run } of put) runs.add(run, id);
  };
  const services: SeedServices = {
    job: {
      list: async () => [],
      create: async (_member, input) => jobs.add(input),
      change: async (_member, seen, input) => jobs.change(seen, input, seen.version),
    },
    contact: { create: async (_member, input) => contacts.add(input) },
    basis: { levels, drawings, addenda },
    place: places,
    service,
    buildUp: buildUps,
    specification: {
      create: specification.create,
      change: async (_member, seen, input) => specification.change(seen, input, input.version),
    },
    run: { patch },
  };
  const data = () =>
    jobDataSchema.parse({
      job: jobs.rows[0],
      levels: levels.rows,
      drawings: drawings.rows,
      addenda: addenda.rows,
      places: places.rows,
      services: service.rows,
      buildUps: buildUps.rows,
      specification: specification.rows,
      runs: runs.rows,
      contacts: contacts.rows.filter(({ id }) => jobs.rows[0]?.contactIds.includes(id)),
    });
  return { services, data };
}

const member: Member = { ...demoEstimator, accountId: randomUUID(), firmId: randomUUID(), units: 'SI' };

/** The demo's job without a database, for benches and tests: as of Revision A, or as it stands with Addendum 1. */
export async function demoInMemory(state: 'revision-a' | 'addendum-1'): Promise<JobData> {
  const { services, data } = inMemory();
  const entering = { services, member, today: new Date() };
  const entered = await enterJob(entering);
  if (state === 'addendum-1') await enterAddendum(entering, entered);
  return data();
}
