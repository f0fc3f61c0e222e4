import { airAt, pressureRatioAt } from '../heat/air';
import { naturalCoefficient, forcedCoefficient } from '../heat/convection-c680';
import { isoForced, isoFree } from '../heat/convection-iso12241';
import { surfaceOf, zeroCelsius } from '../heat/exchange';
import { stefanBoltzmann } from '../heat/radiation';
import type { Curve } from '../standards/rows';
import type { Words } from '../words';
import type { Build } from './build';
import type { WorkingInput, WorkingStep } from './study-types';
import { heatPerLength, setWords, type Solved, type Trial } from './trial';
import { amount } from './verdict';

const fourier =
  'Fourier’s law with the curve’s integral; F. P. Incropera et al., Fundamentals of Heat and Mass Transfer, 6th ed., secs. 3.1 and 3.3';
const curveWords: Record<Curve['kind'], string> = {
  max: 'specification maximum',
  typical: 'typical',
  design: 'design value',
  measured: 'measured',
};

/** Conduction through each layer, from the inside out; none for a bare surface. */
export function conductionSteps({ build }: Trial, solved: Solved): WorkingStep[] {
  return build.names.map((_, place) => layerStep(build, place, solved));
}

function layerStep(build: Build, place: number, { result, heatCase }: Solved): WorkingStep {
  const [inner = NaN, outer = NaN] = result.interfaceTemperatures.slice(place, place + 2);
  const [conductivity, thickness] = [result.meanConductivities[place] ?? NaN, build.thicknesses[place] ?? NaN];
  const isFlat = heatCase.shape.endsWith('flat');
  const flow = amount(isFlat ? 'heatFlux' : 'heatPerLength', result.heatFlow);
  const difference = amount('difference', inner - outer);
  const filled: Words = isFlat
    ? [amount('conductivity', conductivity), ' × ', difference, ' / ', amount('dimension', thickness)]
    : ['2π × ', amount('conductivity', conductivity), ' × ', difference, ' / ln(', ...radii(build, place), ')'];
  return {
    title: `Conduction, layer ${place + 1}`,
    equation: isFlat ? 'q″ = k̄ (T₁ − T₂) / t' : 'q′ = 2π k̄ (T₁ − T₂) / ln(r₂ / r₁)',
    filled,
    result: [flow],
    inputs: layerInputs(build, place, { inner, outer, conductivity, thickness }),
    source: fourier,
  };
}

function radii({ thicknesses, outsideDiameter }: Build, place: number): Words {
  const outwards = thicknesses.slice(place).reduce((sum, thickness) => sum + thickness, 0);
  const inside = (outsideDiameter ?? NaN) / 2 - outwards;
  return [amount('dimension', inside + (thicknesses[place] ?? NaN)), ' / ', amount('dimension', inside)];
}

type LayerNumbers = { inner: number; outer: number; conductivity: number; thickness: number };

function layerInputs(build: Build, place: number, numbers: LayerNumbers): WorkingInput[] {
  const material = build.materials[place];
  const name = build.names[place];
  const curve = material
    ? `${material.name}: ${curveWords[material.curve.kind]}, ${material.curve.source} (${material.curve.confidence})`
    : '';
  const size = build.basis === 'made' ? 'made outside diameter' : 'nominal or installed thickness';
  return [
    {
      symbol: 'T₁',
      meaning: 'inner side',
      value: [amount('temperature', numbers.inner, 2)],
      source: place === 0 ? 'outer surface of the pipe: the fluid, less the drop through a plastic wall' : 'solved',
    },
    { symbol: 'T₂', meaning: 'outer side', value: [amount('temperature', numbers.outer, 2)], source: 'solved' },
    {
      symbol: 'k̄',
      meaning: 'mean of the curve from T₂ to T₁',
      value: [amount('conductivity', numbers.conductivity)],
      source: curve,
    },
    {
      symbol: 't',
      meaning: 'thickness',
      value: [...(name ? [{ thickness: [name] }, ': '] : []), amount('dimension', numbers.thickness)],
      source: size,
    },
  ];
}

/** What the surface gives off by convection and radiation, and that it is what is conducted. */
export function surfaceSteps(trial: Trial, solved: Solved): WorkingStep[] {
  return [convectionStep(trial, solved), radiationStep(trial, solved), balanceStep(trial, solved)];
}

const conditionsSource = (trial: Trial, { judgedAt }: Solved): string =>
  `${trial.input.place.name}, ${setWords[judgedAt.set]}: ${judgedAt.source}`;

function convectionStep(trial: Trial, solved: Solved): WorkingStep {
  const isIso = trial.input.method === 'iso-12241';
  const { result, judgedAt } = solved;
  const inputs: WorkingInput[] = [
    {
      symbol: 'T_s',
      meaning: 'surface',
      value: [amount('temperature', result.surfaceTemperature, 2)],
      source: 'solved',
    },
    {
      symbol: 'T_a',
      meaning: 'air',
      value: [amount('temperature', judgedAt.air)],
      source: conditionsSource(trial, solved),
    },
    { symbol: 'v', meaning: 'wind', value: [amount('speed', judgedAt.wind)], source: conditionsSource(trial, solved) },
    ...partInputs(trial, solved),
  ];
  return {
    title: 'Convection',
    equation: isIso ? 'h_cv = max(h_wind, h_free)' : equationOf(solved),
    filled: isIso ? ['the larger of the two'] : ['natural and forced parts, air at film temperature'],
    result: [amount('coefficient', result.convectiveCoefficient ?? NaN)],
    inputs,
    source: isIso
      ? 'ISO 12241, from memory'
      : 'practice of ASTM C680: S. W. Churchill and H. H. S. Chu (1975) for natural, S. W. Churchill and M. Bernstein (1977) or the flat plate for forced convection',
  };
}

function equationOf({ heatCase: { shape }, judgedAt }: Solved): string {
  if (judgedAt.wind === 0) return 'h_cv = Nu k_air / L';
  return shape === 'horizontal-cylinder' ? 'h_cv⁴ = h_forced⁴ + h_natural⁴' : 'h_cv³ = h_forced³ + h_natural³';
}

/** Natural and forced parts at the solution. */
function partInputs(trial: Trial, { result, heatCase, judgedAt }: Solved): WorkingInput[] {
  const surface = surfaceOf(heatCase, trial.build.outsideDiameter ?? 0);
  const difference = result.surfaceTemperature - judgedAt.air;
  const air = airAt(zeroCelsius + judgedAt.air + difference / 2, pressureRatioAt(trial.input.altitude));
  const isIso = trial.input.method === 'iso-12241';
  const natural = isIso ? isoFree(surface, Math.abs(difference)) : naturalCoefficient(surface, air, difference);
  const part = (symbol: string, meaning: string, value: number): WorkingInput => ({
    symbol,
    meaning,
    value: [amount('coefficient', value)],
    source: isIso
      ? 'ISO 12241, from memory'
      : 'air by the US Standard Atmosphere 1976 at film temperature and altitude',
  });
  const forced = isIso ? isoForced : (on: typeof surface) => forcedCoefficient(on, air);
  return [
    part('h_natural', 'natural part', natural),
    ...(judgedAt.wind > 0 ? [part('h_forced', 'part that wind gives', forced(surface))] : []),
  ];
}

function radiationStep(trial: Trial, solved: Solved): WorkingStep {
  const { result, judgedAt } = solved;
  const finish =
    trial.build.name === null ? 'bare surface' : `${trial.input.finish.name}: ${trial.input.finish.source}`;
  return {
    title: 'Radiation',
    equation: 'h_r = ε σ (T_s² + T_a²)(T_s + T_a), absolute temperatures',
    filled: [radiationFilled(judgedAt.emittance, kelvin(result.surfaceTemperature), kelvin(judgedAt.air))],
    result: [amount('coefficient', result.radiativeCoefficient ?? NaN)],
    inputs: [
      { symbol: 'ε', meaning: 'emittance', value: [String(judgedAt.emittance)], source: finish },
      {
        symbol: 'T_s',
        meaning: 'surface',
        value: [amount('temperature', result.surfaceTemperature, 2)],
        source: 'solved',
      },
      {
        symbol: 'T_a',
        meaning: 'air, and what the surface radiates to',
        value: [amount('temperature', judgedAt.air)],
        source: conditionsSource(trial, solved),
      },
    ],
    source: 'ASHRAE Handbook Fundamentals 2021 ch. 4 eq. 4',
  };
}

const kelvin = (celsius: number): number => celsius + zeroCelsius;

const radiationFilled = (emittance: number, surface: number, air: number): string => {
  const [ts, ta] = [surface.toFixed(2), air.toFixed(2)];
  return `${emittance} × ${stefanBoltzmann.toExponential(4)} × (${ts}² + ${ta}²) × (${ts} + ${ta})`;
};

function balanceStep(trial: Trial, { result, judgedAt }: Solved): WorkingStep {
  const { body } = trial.input;
  const along = heatPerLength(body, trial.build, result);
  const difference = amount('difference', result.surfaceTemperature - judgedAt.air);
  const flux = amount('heatFlux', result.heatFluxDensity);
  const perimeter =
    body.shape === 'rectangular-duct' ? ', times the mean perimeter P + 4t' : ', times the surface per metre';
  return {
    title: 'Balance',
    equation: 'conducted = (h_cv + h_r)(T_s − T_a)',
    filled: [amount('coefficient', result.surfaceCoefficient), ' × ', difference, ' = ', flux],
    result: along === null ? [flux] : [flux, perimeter, ': ', amount('heatPerLength', along)],
    inputs: [],
    source: `solved in ${result.iterations} steps; conducted and given off agree to ${closureWords(result.closure)}`,
  };
}

const closureWords = (closure: number): string =>
  Math.abs(closure) < 1e-12 ? '1e-12' : Math.abs(closure).toExponential(0);
