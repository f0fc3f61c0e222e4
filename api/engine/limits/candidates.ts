import { EngineError } from '../engine-error';
import { nominalThickness, type ThicknessName } from '../standards/thickness-name';
import { bareBuild, bareDiameter, type Build, buildOf, wholeThickness } from './build';
import { madeNames } from './choice-of-series';
import type { StudyInput } from './study-types';

/** Bare first, then every made thickness of the outermost layer from thin to thick; the specified one is among them. */
export type Builds = { builds: Build[]; specified: number | null };

/**
 * The thicknesses that a study compares. Which series: the specified thickness's unit, else the one asked for.
 * Thin and thick go by actual thickness, since two names can share one made diameter.
 *
 * @throws EngineError when the body has no layer, or an inner layer no thickness
 */
export function buildsOf({ body, layers, seriesUnit }: StudyInput): Builds {
  const outer = layers.at(-1);
  if (!outer) throw new EngineError('There is no layer to study', 'layers');
  const specified = outer.thickness;
  const unit = specified === null ? seriesUnit : unitOf(specified);
  const made = madeNames(outer.material, body, { unit, diameter: bareDiameter(body) });
  const names = specified === null || made.includes(specified) ? made : [...made, specified];
  const builds = names.flatMap((name) => {
    const build = buildOf(body, layers, name);
    return build ? [build] : [];
  });
  const ordered = [bareBuild(body), ...builds.sort(byThickness)];
  const place = ordered.findIndex(({ name }) => name !== null && name === specified);
  return { builds: ordered, specified: place < 0 ? null : place };
}

const unitOf = (name: ThicknessName): 'in' | 'mm' => (name.startsWith('in:') ? 'in' : 'mm');

const sameThickness = 1e-9; // m

function byThickness(one: Build, other: Build): number {
  const difference = wholeThickness(one) - wholeThickness(other);
  return Math.abs(difference) > sameThickness ? difference : nominalOf(one) - nominalOf(other);
}

const nominalOf = ({ name }: Build): number => (name === null ? 0 : nominalThickness(name));

/** The next thinner: the nearest before it that is really thinner; bare for the thinnest made. */
export function nextThinner(builds: readonly Pick<Build, 'thicknesses'>[], place: number): number | null {
  const whole = (at: number) => (builds[at]?.thicknesses ?? []).reduce((sum, thickness) => sum + thickness, 0);
  for (let at = place - 1; at >= 0; at -= 1) if (whole(place) - whole(at) > sameThickness) return at;
  return null;
}
