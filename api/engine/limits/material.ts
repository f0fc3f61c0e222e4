import type { Material } from '../standards/rows';
import { dewPoint } from './psychrometrics';
import type { LimitVerdict } from './study-types';
import type { Solved, Trial } from './trial';
import { amount, cannotTell, doesNotApply, highestFluid, judged, lowestFluid, worst } from './verdict';

/**
 * Material: every interface within the use limits of the layers beside it at the highest fluid in the hottest air and
 * the lowest in the coldest; the finish within its own; a vapour retarder where the fluid can be below the place's dew
 * point; flame and smoke in plenums; and each layer's mean within the published points, else it cannot be told.
 *
 * @returns the worst of these; value, limit [°C] and margin [K] where temperatures were compared
 * @source each material's and finish's limit names its own source
 */
export function judgeMaterial(trial: Trial): LimitVerdict {
  const { input, build, solve } = trial;
  if (build.name === null) return doesNotApply('material', ['there is no insulation']);
  const hot = solve({ fluid: highestFluid(input), set: 'hottest', emittance: 'new', isStill: true });
  const cold = solve({ fluid: lowestFluid(input), set: 'coldest', emittance: 'new' });
  const layers = build.materials.flatMap((material, place) => [
    hottestSide(material, place, hot),
    coldestSide(material, place, cold),
    ...unknownMean(material, place, hot),
    ...unknownMean(material, place, cold),
    ...fireOf(material, trial),
  ]);
  return worst([finishOf(trial, hot), ...retarderOf(trial), ...layers]);
}

function finishOf({ input: { finish } }: Trial, { result, judgedAt }: Solved): LimitVerdict {
  const surface = result.surfaceTemperature;
  if (finish.bare) return doesNotApply('material', ['there is no finish']);
  const limit = finish.maximum;
  if (limit === null) {
    return cannotTell('material', [`the temperature limit of the finish is not known: ${finish.name}`], { judgedAt });
  }
  return judged('material', {
    isMet: surface <= limit,
    because: ['the finish reaches ', amount('temperature', surface), '; it stands ', amount('temperature', limit, 0)],
    value: surface,
    limit,
    margin: limit - surface,
    unit: 'temperature',
    judgedAt,
    source: finish.maximumSource,
  });
}

const sidesOf = ({ result }: Solved, place: number): [inner: number, outer: number] => [
  result.interfaceTemperatures[place] ?? NaN,
  result.interfaceTemperatures[place + 1] ?? NaN,
];

function hottestSide(material: Material, place: number, solved: Solved): LimitVerdict {
  const value = Math.max(...sidesOf(solved, place));
  const limit = material.useMaximum;
  const { judgedAt } = solved;
  if (limit === null)
    return cannotTell('material', [`the highest use temperature is not known: ${material.name}`], { judgedAt });
  return judged('material', {
    isMet: value <= limit,
    because: [
      `${material.name} reaches `,
      amount('temperature', value),
      '; it stands ',
      amount('temperature', limit, 0),
    ],
    value,
    limit,
    margin: limit - value,
    unit: 'temperature',
    judgedAt,
    source: material.useMaximumSource,
  });
}

function coldestSide(material: Material, place: number, solved: Solved): LimitVerdict {
  const value = Math.min(...sidesOf(solved, place));
  const limit = material.useMinimum;
  const { judgedAt } = solved;
  if (limit === null)
    return cannotTell('material', [`the lowest use temperature is not known: ${material.name}`], { judgedAt });
  return judged('material', {
    isMet: value >= limit,
    because: [
      `${material.name} falls to `,
      amount('temperature', value),
      '; it may go to ',
      amount('temperature', limit, 0),
    ],
    value,
    limit,
    margin: value - limit,
    unit: 'temperature',
    judgedAt,
    source: material.useMinimumSource,
  });
}

/** Published points are mean temperatures: a layer whose mean lies outside them is not known, whatever was solved. */
function unknownMean({ name, curve }: Material, place: number, solved: Solved): LimitVerdict[] {
  const [inner, outer] = sidesOf(solved, place);
  const mean = (inner + outer) / 2;
  const [first, last] = [curve.points[0]?.[0] ?? NaN, curve.points.at(-1)?.[0] ?? NaN];
  if (mean >= first && mean <= last) return [];
  const because = [
    `the mean of ${name} is `,
    amount('temperature', mean),
    '; its conductivity is published from ',
    amount('temperature', first, 0),
    ' to ',
    amount('temperature', last, 0),
  ];
  const details = { value: mean, unit: 'temperature', judgedAt: solved.judgedAt, source: curve.source } as const;
  return [cannotTell('material', because, details)];
}

/** Flame spread at most 25 and smoke developed at most 50, or noncombustible. */
function fireOf({ name, flameSmoke }: Material, { input: { place } }: Trial): LimitVerdict[] {
  if (!place.plenum) return [];
  const source = '25/50 is the common rule for plenums (ASTM E84); the local code decides';
  if (flameSmoke === null)
    return [cannotTell('material', [`flame and smoke are not known, and this is a plenum: ${name}`], { source })];
  const [flame = NaN, smoke = NaN] = flameSmoke === 'noncombustible' ? [0, 0] : flameSmoke.split('/').map(Number);
  const because = [`flame and smoke of ${name} are ${flameSmoke}; a plenum takes 25/50`];
  return [judged('material', { isMet: flame <= 25 && smoke <= 50, because, source })];
}

function retarderOf({ input, build }: Trial): LimitVerdict[] {
  const { air, humidity, source } = input.place.conditions.mostHumid;
  const lowest = lowestFluid(input);
  if (lowest >= air) return [];
  if (humidity === null) {
    return [cannotTell('material', ['no humidity is entered, so nobody can say whether a vapour retarder is needed'])];
  }
  const dew = dewPoint(air, humidity);
  if (lowest >= dew) return [];
  const isOpen = input.vapourRetarder === 'closed-cell' && !build.materials.at(-1)?.closedCell;
  const needs = [
    `the fluid falls to `,
    amount('temperature', lowest),
    ', below the dew point of ',
    amount('temperature', dew),
  ];
  if (input.vapourRetarder === 'none') {
    return [judged('material', { isMet: false, because: ['there is no vapour retarder, and ', ...needs], source })];
  }
  if (isOpen) {
    return [
      judged('material', {
        isMet: false,
        because: ['the outer layer is not closed-cell, so it is no vapour retarder, and ', ...needs],
        source,
      }),
    ];
  }
  return [judged('material', { isMet: true, because: ['there is a vapour retarder; ', ...needs], source })];
}
