import { EngineError } from '../engine-error';
import { mostConductance, roughResistance, type Wall, wholeDrop } from './conduction';
import type { Exchange } from './exchange';

/** Temperatures [K or °C, differences] that bound the surface: pipe, air and surroundings, each above the air. */
export type Bounds = { pipe: number; lowest: number; highest: number; air: number };

/** Heat flow [W/m or W/m²], the surface above the air [K], and whether the balance fell inside a jump. */
export type Balance = { flow: number; difference: number; iterations: number; isJump: boolean };

type Trial = { flow: number; difference: number; residual: number };
type Bracket = { low: number; high: number };

const tolerance = 5e-10;
const collapsed = 4e-15;
const mostIterations = 200;
const usualCoefficient = 8; // W/(m²·K), only to start from

/**
 * The heat flow for which as much is conducted through the wall as its surface gives off. One unknown: a flow fixes
 * every interface in closed form and so the surface's temperature. Secant steps inside a bracket that bisection keeps
 * shrinking, until conducted and given off agree to 5e-10 of the larger. A correlation that jumps can leave no such
 * flow: then the bracket closes on the jump, where the flow is what is conducted.
 *
 * @param wall - at least one layer
 * @throws EngineError when neither comes about within 200 steps
 * @source regula falsi with secant steps, after R. P. Brent, Algorithms for Minimization without Derivatives, 1973, ch. 4
 */
export function balance(wall: Wall, exchange: Exchange, bounds: Bounds): Balance {
  const bracket = widest(wall, bounds);
  let last: Trial | undefined;
  let flow = within(bracket, startingFlow(wall, exchange, bounds));
  let width = bracket.high - bracket.low;
  for (let iterations = 1; iterations <= mostIterations; iterations += 1) {
    const trial = tried(wall, exchange, { flow, bounds });
    if (isBalanced(trial, wall.area * exchange.noise)) return { ...trial, iterations, isJump: false };
    if (trial.residual > 0) bracket.high = flow;
    else bracket.low = flow;
    if (isCollapsed(bracket)) return atJump(wall, bounds, { bracket, iterations });
    const isSlow = iterations % 3 === 0 && bracket.high - bracket.low > width / 2;
    if (iterations % 3 === 0) width = bracket.high - bracket.low;
    flow = isSlow ? middle(bracket) : within(bracket, nextFlow(trial, last, bounds));
    last = trial;
  }
  throw new EngineError(`The surface balance did not converge in ${mostIterations} steps`);
}

/** A flow that would carry the surface beyond all of its surroundings is too large or too small, whatever they take. */
function tried(wall: Wall, exchange: Exchange, { flow, bounds }: { flow: number; bounds: Bounds }): Trial {
  const difference = bounds.pipe - wholeDrop(wall, flow);
  if (difference < bounds.lowest) return { flow, difference, residual: Infinity };
  if (difference > bounds.highest) return { flow, difference, residual: -Infinity };
  return { flow, difference, residual: flow - wall.area * exchange.flux(difference) };
}

function isBalanced({ flow, residual }: Trial, noise: number): boolean {
  if (!Number.isFinite(residual)) return false;
  return Math.abs(residual) <= Math.max(tolerance * Math.max(Math.abs(flow), Math.abs(flow - residual)), noise);
}

function widest(wall: Wall, { pipe, lowest, highest, air }: Bounds): Bracket {
  const most = mostConductance(wall, air + highest) * (1 + 1e-9);
  return { low: most * (pipe - highest), high: most * (pipe - lowest) };
}

function startingFlow(wall: Wall, exchange: Exchange, { pipe, air }: Bounds): number {
  const resistance = roughResistance(wall, air + pipe / 2);
  return (pipe - exchange.offset / 2) / (resistance + 1 / (usualCoefficient * wall.area));
}

/** The secant through the last two trials; at first the flow through the two resistances that the first trial showed. */
function nextFlow(trial: Trial, last: Trial | undefined, { pipe }: Bounds): number {
  const { flow, residual, difference } = trial;
  if (last && Number.isFinite(last.residual)) {
    return flow - (residual * (flow - last.flow)) / (residual - last.residual);
  }
  return pipe / ((pipe - difference) / flow + difference / (flow - residual));
}

const within = (bracket: Bracket, flow: number): number =>
  flow > bracket.low && flow < bracket.high ? flow : middle(bracket);

const middle = ({ low, high }: Bracket): number => low + (high - low) / 2;

const isCollapsed = ({ low, high }: Bracket): boolean =>
  high - low <= collapsed * Math.max(Math.abs(low), Math.abs(high));

function atJump(
  wall: Wall,
  bounds: Bounds,
  { bracket, iterations }: { bracket: Bracket; iterations: number },
): Balance {
  const flow = middle(bracket);
  return { flow, difference: bounds.pipe - wholeDrop(wall, flow), iterations, isJump: true };
}
