import type { RunInput } from '@/api/contracts/run';
import { fittingsText, kindText, lengthOf, shapeWords, statusWords } from '@/api/contracts/run-words';
import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import { thicknessText } from '@/api/contracts/words-text';

import { joinRuns, rowSize, type RunLookups } from './run-row';

/** All that a run says, as a person reads it: to set two versions side by side. */
export function runFacts(input: RunInput, lookups: RunLookups, units: UnitSystem) {
  const { hold, override } = input;
  return [
    { term: 'Run', value: input.number },
    { term: 'Name', value: input.title },
    { term: 'Kind', value: `${shapeWords[input.shape.kind]}, ${kindText(input.shape)}` },
    ...namedFacts(input, lookups, units),
    ...measuredFacts(input, units),
    { term: 'Fittings', value: fittingsText(input.fittings) },
    { term: 'Status', value: statusWords[input.status] },
    { term: 'Hold', value: hold ? `${hold.reason}, ${hold.by}` : '' },
    { term: 'Departs from the specification', value: override ? overrideText(override, units) : '' },
    { term: 'Note', value: input.note },
  ];
}

function namedFacts(input: RunInput, lookups: RunLookups, units: UnitSystem) {
  return joinRuns([{ ...input, id: '', version: 1 }], undefined, lookups).flatMap((row) => [
    { term: 'Service', value: row.service?.name ?? '' },
    { term: 'Size', value: rowSize(row, units) },
    { term: 'Place', value: row.place?.name ?? '' },
    { term: 'Level', value: row.level?.name ?? '' },
    { term: 'Drawing', value: row.drawing?.number ?? '' },
  ]);
}

function measuredFacts({ shape, elevation }: RunInput, units: UnitSystem) {
  const length = lengthOf(shape);
  return [
    { term: 'Length', value: length === null ? '' : showWithUnit('length', length, { units, digits: 2 }) },
    { term: 'Height above floor', value: elevation ? showWithUnit('elevation', elevation.value, { units }) : '' },
  ];
}

function overrideText({ layers, finishId, reason }: NonNullable<RunInput['override']>, units: UnitSystem): string {
  const names = (layers ?? []).flatMap(({ thickness }) => thickness ?? []);
  return [
    ...(names.length ? [thicknessText(names, units)] : []),
    ...(finishId ? [finishId.replace('std/', '')] : []),
    reason,
  ].join(', ');
}
