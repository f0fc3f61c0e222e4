import type { JobData } from '@/api/contracts/job-data';
import type { AddendumRepository } from './addendum-repository';
import type { BuildUpRepository } from './build-up-repository';
import type { ContactRepository } from './contact-repository';
import type { DrawingRepository } from './drawing-repository';
import type { JobRepository } from './job-repository';
import type { LevelRepository } from './level-repository';
import type { PlaceRepository } from './place-repository';
import type { RunRepository } from './run-repository';
import type { ServiceRepository } from './service-repository';
import type { SpecificationRepository } from './specification-repository';

type Parts = {
  jobs: JobRepository;
  levels: LevelRepository;
  drawings: DrawingRepository;
  addenda: AddendumRepository;
  places: PlaceRepository;
  services: ServiceRepository;
  buildUps: BuildUpRepository;
  specification: SpecificationRepository;
  runs: RunRepository;
  contacts: ContactRepository;
};

/** All that a job holds, in one query for each table, however many rows there are. */
export const createJobDataRepository = (parts: Parts) => ({
  async load(jobId: string): Promise<JobData | undefined> {
    if (!(await parts.jobs.holdStill(jobId))) return undefined;
    const job = await parts.jobs.find(jobId);
    if (!job) return undefined;
    return {
      job,
      levels: await parts.levels.list(jobId),
      drawings: await parts.drawings.list(jobId),
      addenda: await parts.addenda.list(jobId),
      places: await parts.places.list(jobId),
      services: await parts.services.list(jobId),
      buildUps: await parts.buildUps.list(jobId),
      specification: await parts.specification.list(jobId),
      runs: await parts.runs.list(jobId),
      contacts: await parts.contacts.ofJob(jobId),
    };
  },
});
export type JobDataRepository = ReturnType<typeof createJobDataRepository>;
