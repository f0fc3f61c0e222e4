import { ductFittings, fittingKinds, pipeFittings } from '@/api/contracts/run';
import type { FittingKind, Run, RunInput, ShapeKind } from '@/api/contracts/run';
import type { Behind } from '@/db/with-firm';

import { under, type Fields } from './field-problems';
import { finishFields, layersFields, sizeFields } from './library-checks';

type Known = Record<'services' | 'places' | 'levels' | 'drawings', ReadonlySet<string>>;

/** The ids that a run of this job may name: one query for each kind, however many runs. */
export async function knownTo({ services, places, levels, drawings }: Behind, job: string): Promise<Known> {
  return {
    services: await services.ids(job),
    places: await places.ids(job),
    levels: await levels.ids(job),
    drawings: await drawings.ids(job),
  };
}

/** What one run must keep beyond its contract: references within the job, rows of the library. */
export function runFields(run: RunInput, known: Known): Fields {
  return {
    ...referenceFields(run, known),
    ...(run.shape.kind === 'pipe' ? sizeFields('shape.size', run.shape.size) : {}),
    ...fittingFields(run),
    ...holdFields(run),
    ...under('override', overrideFields(run)),
  };
}

function referenceFields({ serviceId, placeId, levelId, drawingId }: RunInput, known: Known): Fields {
  const fields: Fields = {};
  if (!known.services.has(serviceId)) fields.serviceId = 'Not a service of this job';
  if (!known.places.has(placeId)) fields.placeId = 'Not a place of this job';
  if (!known.levels.has(levelId)) fields.levelId = 'Not a level of this job';
  if (drawingId !== null && !known.drawings.has(drawingId)) fields.drawingId = 'Not a drawing of this job';
  return fields;
}

const fittingsOf: Record<ShapeKind, readonly FittingKind[]> = {
  pipe: pipeFittings,
  'round-duct': ductFittings,
  'rectangular-duct': ductFittings,
  vessel: [],
  flat: [],
  piece: [],
};

/** A count that is left from another shape would be taken off for nothing. */
function fittingFields({ shape, fittings }: RunInput): Fields {
  const foreign = fittingKinds.filter((kind) => (fittings[kind] ?? 0) > 0 && !fittingsOf[shape.kind].includes(kind));
  return Object.fromEntries(foreign.map((kind) => [`fittings.${kind}`, 'This shape has no such fitting']));
}

const holdFields = ({ status, hold }: RunInput): Fields =>
  (status === 'on-hold') === (hold !== null) ? {} : { hold: 'A run on hold names the reason and who placed it' };

function overrideFields({ override }: RunInput): Fields {
  if (!override) return {};
  return {
    ...(override.layers ? layersFields('layers', override.layers) : {}),
    ...(override.finishId ? finishFields('finishId', override.finishId) : {}),
  };
}

type Numbered = Pick<Run, 'id' | 'number'>;

/** Runs of a batch whose number another run of the job has, or will have once the batch is in. */
export function numberFields(put: readonly Numbered[], others: readonly Numbered[]): Fields {
  const taken = new Set(others.map(({ number }) => number));
  const fields: Fields = {};
  put.forEach(({ number }, index) => {
    if (taken.has(number)) fields[`put.${index}.number`] = `Another run of this job is ${number}`;
    taken.add(number);
  });
  return fields;
}
