import type { Run } from '@/api/contracts/run';
import type { Candidate, Study, StudyInput } from '@/api/engine/limits/study-types';

import type { Assembled } from './assembly';

/** A case put to the engine, and its answer or why there is none. */
export type Solved = { input: StudyInput | null; study: Study | null; problem: string | null };

/** A run with all that was worked out about it; null where nothing says how to insulate it, or nothing can be solved. */
export type Judged = Solved & { run: Run; assembled: Assembled | null; used: Candidate | null };
