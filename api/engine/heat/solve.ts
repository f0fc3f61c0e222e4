import { balance, type Balance } from './balance';
import { checkCase } from './check-case';
import { dropsFor, type Wall, wallOf } from './conduction';
import { conductivityAt } from './conductivity';
import { type Exchange, exchangeOf, surfaceOf } from './exchange';
import type { HeatCase, HeatResult } from './heat-case';
import { jumpNote, notesOf } from './notes';

export type { HeatCase, HeatResult } from './heat-case';

/**
 * Steady heat flow and temperatures of an insulated or bare surface: conducted = convected + radiated. Heat may flow
 * either way; equal temperatures give exactly zero.
 *
 * @param heatCase - SI, temperatures in °C
 * @throws EngineError naming the field for any input that is missing, no number or out of range; naming the balance
 *   when it does not converge: no number is returned that did not
 * @source ASTM C680 (the practice: layers by their conductivity curves, surface by convection and radiation); ISO 12241
 */
export function solve(heatCase: HeatCase): HeatResult {
  checkCase(heatCase);
  const wall = wallOf(heatCase);
  const surface = surfaceOf(heatCase, wall.diameter);
  const exchange = exchangeOf(heatCase, surface);
  const state = stateOf(heatCase, wall, exchange);
  const flux = state.flow / wall.area;
  const drops = dropsFor(wall, state.flow);
  const interfaces = interfacesOf(heatCase, drops, state.difference);
  const notes = notesOf(heatCase, surface, interfaces);
  return {
    heatFlow: state.flow,
    heatFluxDensity: flux,
    heatFluxDensityAtPipe: state.flow / wall.areaAtPipe,
    surfaceTemperature: heatCase.airTemperature + state.difference,
    interfaceTemperatures: interfaces,
    meanConductivities: meanConductivities(wall, state.flow, { drops, interfaces }),
    ...givenOff(heatCase, exchange, { difference: state.difference, flux, isJump: state.isJump }),
    iterations: state.iterations,
    notes: state.isJump ? [jumpNote, ...notes] : notes,
  };
}

/** A difference [K] below which temperatures are equal: no thermometer and no double beside 273 K could tell. */
const nothing = 1e-12;

function stateOf(heatCase: HeatCase, wall: Wall, exchange: Exchange): Balance {
  const { operatingTemperature, airTemperature } = heatCase;
  const pipe = operatingTemperature - airTemperature;
  const { offset } = exchange;
  if (Math.abs(pipe) < nothing && Math.abs(offset) < nothing)
    return { flow: 0, difference: 0, iterations: 0, isJump: false };
  if (wall.layers.length === 0) {
    return { flow: wall.area * exchange.flux(pipe), difference: pipe, iterations: 0, isJump: false };
  }
  const lowest = Math.min(0, pipe, offset);
  const highest = Math.max(0, pipe, offset);
  return balance(wall, exchange, { pipe, lowest, highest, air: airTemperature });
}

function interfacesOf(heatCase: HeatCase, drops: readonly number[], difference: number): number[] {
  const interfaces = [heatCase.operatingTemperature];
  let temperature = heatCase.operatingTemperature;
  for (const drop of drops) interfaces.push((temperature -= drop));
  interfaces[drops.length] = heatCase.airTemperature + difference;
  return interfaces;
}

type State = { difference: number; flux: number; isJump: boolean };
type Layers = { drops: readonly number[]; interfaces: readonly number[] };

/** k̄ᵢ = heat flow · shape factor / drop: the mean of the curve over the layer's own temperatures. */
function meanConductivities({ layers }: Wall, flow: number, { drops, interfaces }: Layers): number[] {
  return layers.map(({ points, shapeFactor }, place) => {
    const drop = drops[place] ?? 0;
    return drop === 0 ? conductivityAt(points, interfaces[place] ?? 0) : (flow * shapeFactor) / drop;
  });
}

type Given = Pick<HeatResult, 'surfaceCoefficient' | 'convectiveCoefficient' | 'radiativeCoefficient' | 'closure'>;

/** What the surface gives off at the solution, and how well it closes. */
function givenOff({ surface }: HeatCase, exchange: Exchange, { difference, flux, isJump }: State): Given {
  const { convective, radiative, offset } = exchange;
  if (typeof surface === 'object' || !convective || !radiative) {
    const coefficient = exchange.flux(1);
    const closure = closureOf(flux, coefficient * difference);
    return { surfaceCoefficient: coefficient, convectiveCoefficient: null, radiativeCoefficient: null, closure };
  }
  const radiation = radiative(difference);
  const radiated = radiation * (difference - offset);
  // inside a jump: the effective coefficient, so that conducted and given off agree by definition
  const convection = isJump ? (flux - radiated) / difference : convective(difference);
  return {
    surfaceCoefficient: convection + radiation,
    convectiveCoefficient: convection,
    radiativeCoefficient: radiation,
    closure: isJump ? 0 : closureOf(flux, convection * difference + radiated),
  };
}

const closureOf = (conducted: number, given: number): number =>
  conducted === given ? 0 : (conducted - given) / Math.max(Math.abs(conducted), Math.abs(given));
