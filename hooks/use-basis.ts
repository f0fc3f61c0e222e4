import {
  addendumSchema,
  drawingSchema,
  levelSchema,
  type Addendum,
  type AddendumInput,
  type Drawing,
  type DrawingInput,
  type Level,
  type LevelInput,
} from '@/api/contracts/basis';
import { useRowActions, useRows } from '@/hooks/use-job-rows';

const levelsOf = (jobId: string) => ({ path: `/jobs/${jobId}/levels`, schema: levelSchema });
const drawingsOf = (jobId: string) => ({ path: `/jobs/${jobId}/drawings`, schema: drawingSchema });
const addendaOf = (jobId: string) => ({ path: `/jobs/${jobId}/addenda`, schema: addendumSchema });

/** What a job's takeoff is based on. */
export function useBasis(jobId: string) {
  const levels = useRows(levelsOf(jobId));
  const drawings = useRows(drawingsOf(jobId));
  const addenda = useRows(addendaOf(jobId));
  return {
    levels: levels.rows,
    drawings: drawings.rows,
    addenda: addenda.rows,
    problem: levels.problem ?? drawings.problem ?? addenda.problem,
  };
}

export const useLevelActions = (jobId: string) => useRowActions<LevelInput, Level>(levelsOf(jobId), `/jobs/${jobId}`);
export const useDrawingActions = (jobId: string) =>
  useRowActions<DrawingInput, Drawing>(drawingsOf(jobId), `/jobs/${jobId}`);
export const useAddendumActions = (jobId: string) =>
  useRowActions<AddendumInput, Addendum>(addendaOf(jobId), `/jobs/${jobId}`);
