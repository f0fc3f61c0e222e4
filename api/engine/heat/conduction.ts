import type { CurvePoint } from '../standards/rows';
import { conductivityAt, dropFor } from './conductivity';
import type { HeatCase } from './heat-case';

/** One layer as conduction sees it: its curve, and what the curve's integral is divided by to give the heat flow. */
export type WallLayer = { points: readonly CurvePoint[]; shapeFactor: number };

/** All layers, from the inside out; areas in m² per metre of cylinder, or 1 for flats. */
export type Wall = {
  operating: number;
  layers: readonly WallLayer[];
  /** finished outside diameter [m]; 0 for flats */
  diameter: number;
  area: number;
  areaAtPipe: number;
};

/**
 * Steady conduction through layers whose conductivity follows a curve:
 * cylinder q′ · ln(r₂/r₁) / 2π = ∫ k dT, flat q″ · L = ∫ k dT, each between the layer's two temperatures.
 *
 * @param heatCase - checked
 * @returns each layer's ln(r₂/r₁)/2π [-] or thickness [m], which the heat flow multiplies to give the integral
 * @source F. P. Incropera et al., Fundamentals of Heat and Mass Transfer, 6th ed., Wiley, 2007, secs. 3.1 and 3.3
 */
export function wallOf({ shape, outsideDiameter = 0, layers, operatingTemperature }: HeatCase): Wall {
  if (shape.includes('flat')) {
    const factors = layers.map(({ thickness, conductivity }) => ({ points: conductivity, shapeFactor: thickness }));
    return { operating: operatingTemperature, layers: factors, diameter: 0, area: 1, areaAtPipe: 1 };
  }
  let diameter = outsideDiameter;
  const factors = layers.map(({ thickness, conductivity }) => {
    const inner = diameter;
    diameter += 2 * thickness;
    return { points: conductivity, shapeFactor: Math.log(diameter / inner) / (2 * Math.PI) };
  });
  const [area, areaAtPipe] = [Math.PI * diameter, Math.PI * outsideDiameter];
  return { operating: operatingTemperature, layers: factors, diameter, area, areaAtPipe };
}

/**
 * Temperature drops that a heat flow needs, layer by layer.
 *
 * @param flow - W/m or W/m², positive outward
 * @returns n drops [K] from the inside out, with the sign of the flow
 */
export function dropsFor({ operating, layers }: Wall, flow: number): number[] {
  let temperature = operating;
  return layers.map(({ points, shapeFactor }) => {
    const drop = dropFor(points, temperature, flow * shapeFactor);
    temperature -= drop;
    return drop;
  });
}

/** The sum of `dropsFor`, without the list: the balance asks for it again and again. */
export function wholeDrop({ operating, layers }: Wall, flow: number): number {
  let whole = 0;
  for (const { points, shapeFactor } of layers) whole += dropFor(points, operating - whole, flow * shapeFactor);
  return whole;
}

/**
 * Resistance with every layer's conductivity at one temperature: only a guess to start from.
 *
 * @returns [m·K/W] per metre, or [m²·K/W]
 */
export function roughResistance({ layers }: Wall, temperature: number): number {
  let resistance = 0;
  for (const { points, shapeFactor } of layers) resistance += shapeFactor / conductivityAt(points, temperature);
  return resistance;
}

/**
 * The most heat that can flow per kelvin: with every layer at the highest conductivity that it has up to a temperature,
 * no layer lets more through than it would alone.
 *
 * @returns [W/(m·K)] per metre, or [W/(m²·K)]
 */
export function mostConductance({ layers }: Wall, hottest: number): number {
  let most = Infinity;
  for (const { points, shapeFactor } of layers) {
    let highest = conductivityAt(points, hottest);
    for (const point of points) highest = Math.max(highest, point[1]);
    most = Math.min(most, highest / shapeFactor);
  }
  return most;
}
