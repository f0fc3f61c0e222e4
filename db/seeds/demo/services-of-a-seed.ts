import type { Addendum, AddendumInput, Drawing, DrawingInput, Level, LevelInput } from '@/api/contracts/basis';
import type { BuildUp, BuildUpInput, SpecificationRow, SpecificationRowInput } from '@/api/contracts/build-up';
import type { Contact, ContactInput } from '@/api/contracts/contact';
import type { Job, JobInput, JobSummary } from '@/api/contracts/job';
import type { Place, PlaceInput } from '@/api/contracts/place';
import type { Revision } from '@/api/contracts/revision';
import type { RunsPatch } from '@/api/contracts/run';
import type { SendInput } from '@/api/contracts/sending';
import type { Service, ServiceInput } from '@/api/contracts/service';
import type { Member } from '@/api/contracts/session';

type Create<Input, Row> = (member: Member, job: string, input: Input) => Promise<Row>;
type RowOfJob = { job: string; id: string };

/** What a seed needs of the services: the same calls as a person's work makes. */
export type SeedServices = {
  job: {
    list(member: Member): Promise<JobSummary[]>;
    create(member: Member, input: JobInput): Promise<Job>;
    change(member: Member, seen: { id: string; version: number }, input: JobInput): Promise<Job>;
  };
  contact: { create(member: Member, input: ContactInput): Promise<Contact> };
  basis: {
    levels: { create: Create<LevelInput, Level> };
    drawings: { create: Create<DrawingInput, Drawing> };
    addenda: { create: Create<AddendumInput, Addendum> };
  };
  place: { create: Create<PlaceInput, Place> };
  service: { create: Create<ServiceInput, Service> };
  buildUp: { create: Create<BuildUpInput, BuildUp> };
  specification: {
    create: Create<SpecificationRowInput, SpecificationRow>;
    change(
      member: Member,
      row: RowOfJob,
      input: SpecificationRowInput & { version: number },
    ): Promise<SpecificationRow>;
  };
  run: { patch(member: Member, job: string, batch: RunsPatch): Promise<unknown> };
};

/** What freezes a revision and sends it. */
export type RevisionServices = {
  revision: {
    freeze(member: Member, job: string): Promise<Revision>;
    send(member: Member, revision: string, input: SendInput): Promise<Revision>;
  };
};

/** Services at the moment that a clock shows. */
export type ServicesAt = (clock: () => Date) => SeedServices & RevisionServices;
