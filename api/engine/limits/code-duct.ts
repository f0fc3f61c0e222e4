import { conductivityAt } from '../heat/conductivity';
import type { CodeDuctTable, CodeEdition, DuctUse } from '../standards/energy-codes';
import type { Words } from '../words';
import type { LimitVerdict, StudyInput } from './study-types';
import type { Trial } from './trial';
import { amount, cannotTell, doesNotApply, judged } from './verdict';

const resistanceUnit = 0.1761101838; // m²·K/W in one h·ft²·°F/Btu
const ratingMean = 24; // °C

/**
 * Energy code for ducts: installed R = Σ thickness / k at 24 °C, without air films, at least the table's for the job's
 * climate zone and the place's location class. A duct that both heats and cools takes the table for both.
 *
 * @returns value, limit and margin [m²·K/W]; `cannot tell` without zone, location or table
 * @source the edition's duct table
 */
export function judgeDuctCode({ input, build }: Trial, edition: CodeEdition): LimitVerdict {
  const table = edition.ducts;
  if (!table) return cannotTell('energy-code', [`no duct table of ${edition.title} is entered`]);
  const source = `${edition.title}, ${table.name} (${table.source}; ${table.confidence})`;
  const found = leastResistance(table, input);
  if (typeof found !== 'number') return cannotTell('energy-code', found, { source });
  if (found === 0) return doesNotApply('energy-code', ['the table asks for no insulation here'], source);
  const limit = found * resistanceUnit;
  const value = build.thicknesses.reduce((sum, thickness, place) => {
    const points = build.materials[place]?.curve.points ?? [];
    return sum + thickness / conductivityAt(points, ratingMean);
  }, 0);
  return judged('energy-code', {
    isMet: value >= limit,
    because: ['the table entered asks for ', amount('resistance', limit), '; there is ', amount('resistance', value)],
    value,
    limit,
    margin: value - limit,
    unit: 'resistance',
    source,
  });
}

/** The table's R [h·ft²·°F/Btu], or why it cannot be found. */
function leastResistance(table: CodeDuctTable, { place, climateZone, states }: StudyInput): number | Words {
  if (place.ductLocation === null) return ['no duct location is entered for this place'];
  const column = table.locations.findIndex(({ id }) => id === place.ductLocation);
  if (column < 0) return ['the table entered does not know the duct location of this place'];
  const zone = Number(/^\d+/.exec(climateZone)?.[0] ?? NaN);
  const row = (table.values[wayOf(states)] ?? table.values.both)?.find((values) => values.zone === zone);
  return row?.R[column] ?? [`the table entered has no climate zone ${climateZone || '(none entered)'}`];
}

function wayOf(states: StudyInput['states']): DuctUse {
  const isHot = states.some(({ nature }) => nature === 'hot');
  const isCold = states.some(({ nature }) => nature === 'cold');
  if (isHot && isCold) return 'both';
  return isHot ? 'heating' : 'cooling';
}
