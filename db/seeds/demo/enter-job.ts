import { randomUUID } from 'node:crypto';

import type { BuildUpInput, SpecificationRow, SpecificationRowInput } from '@/api/contracts/build-up';
import type { Job, JobInput } from '@/api/contracts/job';
import type { RunsPatch } from '@/api/contracts/run';
import type { ServiceInput, ServiceLimit } from '@/api/contracts/service';
import type { Member } from '@/api/contracts/session';

import { demoDays, demoDrawings, demoJob, demoLevels, demoTimes, demoZone } from './basis';
import { demoBuildUps, type DemoBuildUp } from './build-ups';
import { dayFrom } from './days';
import { demoLevel1Runs } from './level-1-runs';
import { demoLevel2Runs } from './level-2-runs';
import { demoLevel3Runs } from './level-3-runs';
import { demoContacts } from './people';
import { demoPlaces } from './places';
import type { DemoRun } from './run-parts';
import type { SeedServices } from './services-of-a-seed';
import { demoServices, type DemoLimit, type DemoService } from './services';
import { demoDuctRows, demoEquipmentRows, demoPipeRows, type DemoRow } from './specification';

export type Entering = { services: SeedServices; member: Member; today: Date };

/** What has an id by now, by the key under which the data name it. */
export type Ids = Record<'contacts' | 'levels' | 'drawings' | 'places' | 'services', ReadonlyMap<string, string>>;
export type Entered = { job: Job; ids: Ids; specification: SpecificationRow[] };

/** The job as it was taken off before Revision A: no R34 and no row for it, bright metal on the roof. */
export async function enterJob(entering: Entering): Promise<Entered> {
  const { services, member } = entering;
  const contacts = await inTurn(Object.entries(demoContacts), ([key, input]) =>
    services.contact.create(member, input).then(({ id }) => [key, id] as const),
  );
  const job = await services.job.create(member, jobInput(entering, new Map(contacts), demoDays.bidInRevisionA));
  const ids: Ids = {
    contacts: new Map(contacts),
    ...(await enterBasis(entering, job.id)),
    ...(await enterPlaces(entering, job.id)),
  };
  for (const buildUp of demoBuildUps) await services.buildUp.create(member, job.id, scoped(buildUp, ids));
  const rows = [...demoPipeRows, ...demoDuctRows, ...demoEquipmentRows];
  const specification = await inTurn(rows, (row) => services.specification.create(member, job.id, scoped(row, ids)));
  await enterRuns(entering, { job, ids }, [...demoLevel1Runs, ...demoLevel2Runs, ...demoLevel3Runs]);
  return { job, ids, specification };
}

/** The client is Marisel; the hospital and the engineer read along. */
export const jobInput = ({ today }: Entering, contacts: ReadonlyMap<string, string>, bidInDays: number): JobInput => ({
  ...demoJob,
  contactIds: ['marisel', 'oskar', 'ivo'].map((key) => idOf(contacts, key)),
  bidDue: { date: dayFrom(today, { zone: demoZone, days: bidInDays }), time: demoTimes.bid, zone: demoZone },
});

async function enterBasis({ services: { basis }, member, today }: Entering, job: string) {
  const levels = await inTurn(Object.entries(demoLevels), ([key, input]) =>
    basis.levels.create(member, job, input).then(({ id }) => [key, id] as const),
  );
  const date = dayFrom(today, { zone: demoZone, days: demoDays.drawings });
  const drawings = await inTurn(Object.entries(demoDrawings), ([number, input]) =>
    basis.drawings.create(member, job, { number, ...input, date }).then(({ id }) => [number, id] as const),
  );
  return { levels: new Map(levels), drawings: new Map(drawings) };
}

async function enterPlaces({ services, member }: Entering, job: string) {
  const places = new Map(
    await inTurn(Object.entries(demoPlaces), ([key, input]) =>
      services.place.create(member, job, input).then(({ id }) => [key, id] as const),
    ),
  );
  const entered = await inTurn(Object.entries(demoServices), ([key, input], position) =>
    services.service.create(member, job, serviceInput(input, places, position)).then(({ id }) => [key, id] as const),
  );
  return { places, services: new Map(entered) };
}

const serviceInput = (service: DemoService, places: ReadonlyMap<string, string>, position: number): ServiceInput => ({
  ...service,
  position,
  limits: service.limits.map((limit) => limitInput(limit, places)),
});

function limitInput({ place, ...limit }: DemoLimit, places: ReadonlyMap<string, string>): ServiceLimit {
  return { ...limit, placeId: place === null ? null : idOf(places, place) };
}

/** A row or a build-up with ids in place of keys. */
export function scoped(row: DemoRow, ids: Ids): SpecificationRowInput;
export function scoped(row: DemoBuildUp, ids: Ids): BuildUpInput;
export function scoped({ service, places, ...row }: DemoRow | DemoBuildUp, ids: Ids) {
  return {
    ...row,
    serviceId: idOf(ids.services, service),
    placeIds: places.map((place) => idOf(ids.places, place)),
  };
}

export async function enterRuns(
  { services, member }: Entering,
  { job, ids }: Pick<Entered, 'job' | 'ids'>,
  runs: readonly DemoRun[],
): Promise<void> {
  const put = runs.map((run) => runPut(run, ids));
  await services.run.patch(member, job.id, { put, drop: [] });
}

const runPut = ({ service, place, level, drawing, ...run }: DemoRun, ids: Ids): RunsPatch['put'][number] => ({
  ...run,
  id: randomUUID(),
  version: null,
  serviceId: idOf(ids.services, service),
  placeId: idOf(ids.places, place),
  levelId: idOf(ids.levels, level),
  drawingId: drawing && idOf(ids.drawings, drawing),
});

export function idOf(ids: ReadonlyMap<string, string>, key: string): string {
  const id = ids.get(key);
  if (!id) throw new Error(`The demo names ${key} before it is entered`);
  return id;
}

/** One after the other, in the order in which a person would enter them. */
async function inTurn<Item, Result>(
  items: readonly Item[],
  enter: (item: Item, position: number) => Promise<Result>,
): Promise<Result[]> {
  const results: Result[] = [];
  for (const [position, item] of items.entries()) results.push(await enter(item, position));
  return results;
}
