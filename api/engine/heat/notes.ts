import { airAt } from './air';
import { isWithin } from './conductivity';
import type { HeatCase } from './heat-case';
import { rayleigh } from './natural-convection';
import type { Surface } from './surface';

export const jumpNote =
  'The convection formula jumps here and the balance falls inside the jump: the surface is at the jump, the coefficient is the effective one.';

/** Ranges in which the natural formulas are stated, by shape. */
const rayleighRanges = {
  'horizontal-cylinder': [1e-6, 1e12],
  'vertical-cylinder': [0.1, 1e12],
  'vertical-flat': [0.1, 1e12],
  'horizontal-flat-up': [1e4, 1e11],
  'horizontal-flat-down': [1e4, 1e11],
} as const;

/** What a reader must know of a result: curves continued, formulas outside their stated range. */
export function notesOf(heatCase: HeatCase, surface: Surface, interfaces: readonly number[]): string[] {
  const difference = (interfaces.at(-1) ?? 0) - heatCase.airTemperature;
  return [...curveNotes(heatCase, interfaces), ...surfaceNotes(heatCase, surface, difference)];
}

function curveNotes({ layers }: HeatCase, interfaces: readonly number[]): string[] {
  return layers.flatMap(({ conductivity }, place) => {
    const [inner, outer] = [interfaces[place] ?? NaN, interfaces[place + 1] ?? NaN];
    if (conductivity.length === 1)
      return [`Layer ${place + 1}: one point of conductivity is known, taken as constant.`];
    return isWithin(conductivity, inner, outer)
      ? []
      : [`Layer ${place + 1}: part of it lies outside the published points of its conductivity, which are continued.`];
  });
}

function surfaceNotes(heatCase: HeatCase, surface: Surface, difference: number): string[] {
  if (heatCase.surface === 'astm-c680') return c680Notes(surface, difference);
  if (heatCase.surface === 'iso-12241') return isoNotes(heatCase);
  return heatCase.surroundingsTemperature === undefined || heatCase.surroundingsTemperature === heatCase.airTemperature
    ? []
    : ['The given coefficient holds radiation: the temperature of the surroundings is not used.'];
}

function isoNotes({ shape, altitude = 0 }: HeatCase): string[] {
  return [
    ...(shape.startsWith('horizontal-flat')
      ? ['ISO 12241 has no formula for horizontal surfaces: its formula for walls is used.']
      : []),
    ...(altitude === 0 ? [] : ['The constants of ISO 12241 are for sea level: altitude is not counted.']),
  ];
}

function c680Notes(surface: Surface, difference: number): string[] {
  const film = surface.air + difference / 2;
  const air = airAt(film, surface.pressureRatio);
  const notes = [];
  const ra = rayleigh(air, difference, surface.length);
  const [least, most] = rayleighRanges[surface.shape];
  if (ra > most || (ra < least && difference !== 0)) {
    notes.push('The Rayleigh number lies outside the range stated for the natural convection formula.');
  }
  const reynolds = (surface.wind * surface.windLength) / air.viscosity;
  if (surface.wind > 0 && surface.isCylinder && reynolds * air.prandtl < 0.2) {
    notes.push('The wind is too slow for the range stated for the forced convection formula.');
  }
  if (film < 200 || film > 700)
    notes.push('The air beside the surface lies outside 200 to 700 K, where its properties are known well.');
  return notes;
}
