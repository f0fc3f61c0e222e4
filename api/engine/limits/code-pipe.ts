import { conductivityAt } from '../heat/conductivity';
import { type CodeBand, codeColumns, type CodeEdition } from '../standards/energy-codes';
import { findPipeSize } from '../standards/pipe-sizes';
import type { Curve } from '../standards/rows';
import type { ThicknessName } from '../standards/thickness-name';
import type { Words } from '../words';
import { type Build, wholeThickness } from './build';
import type { Body, FluidState, LimitVerdict } from './study-types';
import type { Trial } from './trial';
import { amount, cannotTell, doesNotApply, judged } from './verdict';

const inch = 0.0254;
const conductivityUnit = 0.1442278889; // W/(m·K) in one Btu·in/(h·ft²·°F)
const ratingFit = 0.5; // K by which a rating mean may lie beyond a curve's last point: tables round to whole degrees

export const fahrenheit = (celsius: number): number => Math.round((celsius * 1.8 + 32) * 10) / 10;
const celsius = (degrees: number): number => (degrees - 32) / 1.8;

type Pipe = Extract<Body, { shape: 'pipe' }>;

/**
 * Energy code for pipes, at operating temperature. The material's conductivity K at the table's rating mean, rounded as
 * the table prints it, within the printed range: met by the nominal thickness that the name says. Outside it the
 * adjusted thickness T = r[(1 + t/r)^(K/k) − 1] is compared with the actual thickness; r the pipe's actual outside
 * radius, t the table's thickness, k the end of the range that the edition names.
 *
 * @returns value, limit and margin [m]; `cannot tell` where the size has no nominal inches or the curve ends too early
 * @source the edition's table; the adjustment as quoted in ASHRAE Handbook Fundamentals 2021 ch. 23 Table 2
 */
export function judgePipeCode(
  trial: Trial,
  edition: CodeEdition,
  { pipe, state }: { pipe: Pipe; state: FluidState },
): LimitVerdict {
  const band = bandOf(edition, state.operating);
  if (!band) return doesNotApply('energy-code', between60And105, sourceOf(edition));
  const column = columnOf(pipe);
  const asked = column === null ? undefined : band.thicknesses[column];
  if (asked === undefined) return cannotTell('energy-code', noNominal, { source: sourceOf(edition) });
  const { build } = trial;
  if (build.name === null) return judgeByName(build, edition, { band, asked });
  const conductivity = ratedConductivity(build, band);
  if (conductivity === null) return cannotTell('energy-code', curveEnds(band), { source: sourceOf(edition) });
  const isInRange = conductivity >= band.conductivity[0] && conductivity <= band.conductivity[1];
  return isInRange && build.names.every((name) => name.startsWith('in:'))
    ? judgeByName(build, edition, { band, asked })
    : judgeByActual(build, edition, { band, asked, pipe, conductivity });
}

const between60And105: Words = [
  'the fluid is between ',
  amount('temperature', celsius(60), 0),
  ' and ',
  amount('temperature', celsius(105), 0),
];
const noNominal: Words = ['this size has no nominal inches, and the table is in them'];
const curveEnds = ({ ratingMean }: CodeBand): Words => [
  'the table rates conductivity at a mean of ',
  amount('temperature', celsius(ratingMean), 0),
  ', outside the published points of the material',
];

export const sourceOf = ({ title, pipes }: CodeEdition): string =>
  `${title}, ${pipes.name} (${pipes.source}; ${pipes.confidence})`;

/** The band of a fluid temperature, compared in °F to 0.1; undefined between 60 and 105 °F, which no band covers. */
export function bandOf({ pipes }: CodeEdition, operating: number): CodeBand | undefined {
  const fluid = fahrenheit(operating);
  return pipes.bands.find(({ from, to, fromIncluded, toIncluded }) => {
    const isAbove = from === null || fluid > from || (fromIncluded && fluid === from);
    const isBelow = to === null || fluid < to || (toIncluded && fluid === to);
    return isAbove && isBelow;
  });
}

export function columnOf({ standard, nominal }: Pipe): number | null {
  const inches = standard && nominal ? (findPipeSize(standard, nominal)?.nominalInches ?? null) : null;
  if (inches === null) return null;
  return codeColumns().findIndex(({ from, below }) => inches >= from && (below === null || inches < below));
}

/** The material's conductivity at the table's rating mean as the table prints it [Btu·in/(h·ft²·°F)]; of layers the highest. */
export function ratedConductivity({ materials }: Build, { ratingMean }: CodeBand): number | null {
  const mean = celsius(ratingMean);
  if (!materials.every(({ curve }) => reaches(curve, mean))) return null;
  const highest = Math.max(...materials.map(({ curve }) => conductivityAt(curve.points, mean)));
  return Math.round((highest / conductivityUnit) * 100) / 100;
}

const reaches = ({ points }: Curve, mean: number): boolean =>
  mean >= (points[0]?.[0] ?? NaN) - ratingFit && mean <= (points.at(-1)?.[0] ?? NaN) + ratingFit;

type Row = { band: CodeBand; asked: number };

function judgeByName(build: Build, edition: CodeEdition, { asked }: Row): LimitVerdict {
  const has = build.names.reduce((sum, name) => sum + inchesOf(name), 0);
  const [value, limit] = [has * inch, asked * inch];
  return judged('energy-code', {
    isMet: has >= asked,
    because: ['the table entered asks for ', { thickness: [`in:${asked}`] }, '; there is ', put(build)],
    value,
    limit,
    margin: (has - asked) * inch,
    unit: 'dimension',
    source: sourceOf(edition),
  });
}

const inchesOf = (name: ThicknessName): number => Number(name.slice('in:'.length));
const put = ({ names }: Build): Words[number] => (names.length === 0 ? 'none' : { thickness: names });

function judgeByActual(
  build: Build,
  edition: CodeEdition,
  { band, asked, pipe, conductivity }: Row & { pipe: Pipe; conductivity: number },
): LimitVerdict {
  const [low, high] = band.conductivity;
  const isInRange = conductivity >= low && conductivity <= high;
  const end = edition.end === 'upper' ? high : low;
  const limit = isInRange
    ? asked * inch
    : adjustedThickness(asked * inch, { radius: pipe.outsideDiameter / 2, ratio: conductivity / end });
  const value = wholeThickness(build);
  const adjusted = isInRange
    ? 'the table entered asks for '
    : 'the table entered, adjusted for this conductivity, asks for ';
  return judged('energy-code', {
    isMet: value >= limit,
    because: [adjusted, amount('dimension', limit), '; the actual thickness is ', amount('dimension', value)],
    value,
    limit,
    margin: value - limit,
    unit: 'dimension',
    source: `${sourceOf(edition)}; adjustment: ${edition.endSource}`,
  });
}

/**
 * Thickness that a material outside the table's conductivity range needs: T = r[(1 + t/r)^(K/k) − 1]
 *
 * @param thickness - t, the table's [m]
 * @param radius - r, the pipe's actual outside radius [m]
 * @param ratio - K/k
 * @returns T [m]
 * @source ASHRAE 90.1 table notes as in ASHRAE Handbook Fundamentals 2021 ch. 23 Table 2
 */
export const adjustedThickness = (thickness: number, { radius, ratio }: { radius: number; ratio: number }): number =>
  radius * ((1 + thickness / radius) ** ratio - 1);
