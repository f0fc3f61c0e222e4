import type { SpecificationRow, SpecificationRowInput } from '@/api/contracts/build-up';
import type { WithFirm } from '@/db/with-firm';

import { coveringFields } from './build-up-service';
import { createJobRowService } from './job-rows';

/** The table as an engineer hands it down. */
export const createSpecificationService = ({ withFirm }: { withFirm: WithFirm }) =>
  createJobRowService<SpecificationRowInput, SpecificationRow>(withFirm, {
    noun: 'specification row',
    rows: ({ specification }) => specification,
    unique: { field: 'label', of: ({ label }) => label },
    check: (behind, { job, input }) => coveringFields(behind, job, input),
  });
export type SpecificationService = ReturnType<typeof createSpecificationService>;
