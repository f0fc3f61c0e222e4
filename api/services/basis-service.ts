import type { Addendum, AddendumInput, Drawing, DrawingInput, Level, LevelInput } from '@/api/contracts/basis';
import type { WithFirm } from '@/db/with-firm';

import { createJobRowService } from './job-rows';

/** What a takeoff is based on: levels, drawings, addenda. */
export const createBasisService = ({ withFirm }: { withFirm: WithFirm }) => ({
  levels: createJobRowService<LevelInput, Level>(withFirm, {
    noun: 'level',
    rows: ({ levels }) => levels,
    unique: { field: 'name', of: ({ name }) => name },
    uses: async ({ runs }, { job, id }) => [[await runs.count(job, { level_id: id }), 'run', 'runs']],
  }),
  drawings: createJobRowService<DrawingInput, Drawing>(withFirm, {
    noun: 'drawing',
    rows: ({ drawings }) => drawings,
    unique: { field: 'number', of: ({ number }) => number },
    uses: async ({ runs }, { job, id }) => [[await runs.count(job, { drawing_id: id }), 'run', 'runs']],
  }),
  addenda: createJobRowService<AddendumInput, Addendum>(withFirm, {
    noun: 'addendum',
    rows: ({ addenda }) => addenda,
    unique: { field: 'number', of: ({ number }) => number },
  }),
});
export type BasisService = ReturnType<typeof createBasisService>;
