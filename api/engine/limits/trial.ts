import { EngineError } from '../engine-error';
import type { HeatCase, HeatLayer, HeatResult } from '../heat/heat-case';
import { solve } from '../heat/solve';
import { bareSurface } from './bare-surface';
import { type Build, wholeThickness } from './build';
import { plasticWall, withoutWall } from './plastic-wall';
import type { Body, ConditionSet, HeatAnswer, JudgedAt, Orientation, StudyInput } from './study-types';

/** What a surface is asked under: a fluid temperature [°C], a set of air, and which emittance. */
export type Asked = { fluid: number; set: ConditionSet; emittance: 'new' | 'aged'; isStill?: boolean };

/** One build of a study, which solves each case it is asked once. */
export type Trial = {
  input: StudyInput;
  build: Build;
  solve: (asked: Asked) => Solved;
};
export type Solved = { result: HeatResult; heatCase: HeatCase; judgedAt: JudgedAt };

export function trialOf(input: StudyInput, build: Build): Trial {
  const solved: Solved[] = [];
  const shape = heatShapeOf(input.body, build);
  return {
    input,
    build,
    solve: (asked) => {
      const judgedAt = judgedAtOf(input, build, asked);
      const known = solved.find((other) => isSameCase(other.judgedAt, judgedAt));
      if (known) return { result: known.result, heatCase: known.heatCase, judgedAt };
      const heatCase = heatCaseOf(input, shape, judgedAt);
      const fresh = { result: solveNamed(input, judgedAt, heatCase), heatCase, judgedAt };
      solved.push(fresh);
      return fresh;
    },
  };
}

const isSameCase = (one: JudgedAt, other: JudgedAt): boolean =>
  one.fluid === other.fluid && one.air === other.air && one.wind === other.wind && one.emittance === other.emittance;

function judgedAtOf({ place, finish, body }: StudyInput, build: Build, asked: Asked): JudgedAt {
  const { air, humidity, wind, source } = place.conditions[asked.set];
  const surface = build.name === null ? bareSurface(body) : finish;
  const emittance = asked.emittance === 'new' ? surface.emittanceNew : surface.emittanceAged;
  return { set: asked.set, fluid: asked.fluid, air, humidity, wind: asked.isStill ? 0 : wind, emittance, source };
}

type HeatShapeOfBody = Pick<HeatCase, 'shape' | 'outsideDiameter' | 'height' | 'layers'>;

/** What stays the same from case to case. A rectangular duct is its vertical side at insulated height. */
export function heatShapeOf(body: Body, build: Build): HeatShapeOfBody {
  const layers = build.thicknesses.map((thickness, place) => ({
    thickness,
    conductivity: build.materials[place]?.curve.points ?? [],
  }));
  const thickness = wholeThickness(build);
  switch (body.shape) {
    case 'pipe':
      return cylinder(body, { ...onPlastic(body, layers), height: body.height ?? undefined });
    case 'round-duct':
      return { shape: 'horizontal-cylinder', outsideDiameter: body.diameter, height: undefined, layers };
    case 'rectangular-duct':
      return { shape: 'vertical-flat', outsideDiameter: undefined, height: body.height + 2 * thickness, layers };
    case 'vessel':
      return cylinder(body, { outsideDiameter: body.diameter, height: body.length + 2 * thickness, layers });
    case 'flat':
      return { shape: 'vertical-flat', outsideDiameter: undefined, height: body.height, layers };
  }
}

function onPlastic(body: Extract<Body, { shape: 'pipe' }>, layers: readonly HeatLayer[]) {
  const wall = plasticWall(body);
  if (!wall) return { outsideDiameter: body.outsideDiameter, layers };
  return { outsideDiameter: body.outsideDiameter - 2 * wall.thickness, layers: [wall, ...layers] };
}

const cylinder = (
  { orientation }: { orientation: Orientation },
  { outsideDiameter, height, layers }: Omit<HeatShapeOfBody, 'shape'>,
): HeatShapeOfBody =>
  orientation === 'horizontal'
    ? { shape: 'horizontal-cylinder', outsideDiameter, height: undefined, layers }
    : { shape: 'vertical-cylinder', outsideDiameter, height, layers };

export const heatCaseOf = (
  { altitude, method }: StudyInput,
  { shape, outsideDiameter, height, layers }: HeatShapeOfBody,
  at: JudgedAt,
): HeatCase => ({
  shape,
  outsideDiameter,
  height,
  layers,
  operatingTemperature: at.fluid,
  airTemperature: at.air,
  emittance: at.emittance,
  windSpeed: at.wind,
  altitude,
  surface: method,
});

function solveNamed({ place, body }: StudyInput, { set }: JudgedAt, heatCase: HeatCase): HeatResult {
  try {
    return plasticWall(body) ? withoutWall(solve(heatCase)) : solve(heatCase);
  } catch (error) {
    if (!(error instanceof EngineError)) throw error;
    throw new EngineError(`${place.name}, ${setWords[set]}: ${error.message}`, error.field);
  }
}

export const setWords: Record<ConditionSet, string> = {
  hottest: 'hottest air',
  mostHumid: 'most humid air',
  coldest: 'coldest air',
  warmest: 'warmest air',
  mean: 'mean air',
};

/**
 * Heat per metre: of cylinders as solved; of rectangular ducts the flux through the flat insulation times the mean
 * perimeter P + 4t, P the metal's.
 *
 * @returns [W/m]; null for flats
 * @source ISO 12241's rule for rectangular ducts, from memory
 */
export function heatPerLength(body: Body, build: Build, result: HeatResult): number | null {
  if (body.shape === 'flat') return null;
  if (body.shape !== 'rectangular-duct') return result.heatFlow;
  return result.heatFlow * (2 * (body.width + body.height) + 4 * wholeThickness(build));
}

export const heatAnswer = ({ input, build }: Trial, { result, judgedAt }: Solved): HeatAnswer => ({
  heatFlow: heatPerLength(input.body, build, result),
  flux: result.heatFluxDensity,
  surface: result.surfaceTemperature,
  interfaces: result.interfaceTemperatures,
  meanConductivities: result.meanConductivities,
  coefficient: result.surfaceCoefficient,
  convective: result.convectiveCoefficient ?? result.surfaceCoefficient,
  radiative: result.radiativeCoefficient ?? 0,
  closure: result.closure,
  judgedAt,
  notes: result.notes,
});
