import type { CurvePoint } from '../standards/rows';

export const heatShapes = [
  'horizontal-cylinder',
  'vertical-cylinder',
  'vertical-flat',
  'horizontal-flat-up',
  'horizontal-flat-down',
] as const;
export type HeatShape = (typeof heatShapes)[number];

/** From the inside out: thickness [m], and conductivity [W/(m·K)] against mean temperature [°C], temperatures rising. */
export type HeatLayer = { thickness: number; conductivity: readonly CurvePoint[] };

/** How the surface gives its heat off; a given coefficient [W/(m²·K)] holds convection and radiation together. */
export type SurfaceChoice = 'astm-c680' | 'iso-12241' | { coefficient: number };

/** One steady case, SI, temperatures in °C. */
export type HeatCase = {
  shape: HeatShape;
  /** of the bare pipe or duct [m]; cylinders only */
  outsideDiameter?: number;
  /** of a vertical cylinder or vertical flat [m]; of a vertical flat also the length along the wind */
  height?: number;
  /** of a horizontal flat [m]: area over perimeter */
  characteristicLength?: number;
  /** of a horizontal flat [m]: the length along the wind */
  windLength?: number;
  /** empty: a bare surface */
  layers: readonly HeatLayer[];
  /** at the surface of the pipe */
  operatingTemperature: number;
  airTemperature: number;
  /** what the surface radiates to; else the air's temperature */
  surroundingsTemperature?: number;
  /** above 0 and at most 1; not needed where the coefficient is given */
  emittance?: number;
  windSpeed?: number;
  /** above sea level [m] */
  altitude?: number;
  surface: SurfaceChoice;
};

export type HeatResult = {
  /** W/m for cylinders, W/m² for flats; positive outward */
  heatFlow: number;
  /** at the jacket [W/m²] */
  heatFluxDensity: number;
  /** at the bare pipe, duct or wall [W/m²] */
  heatFluxDensityAtPipe: number;
  surfaceTemperature: number;
  /** from the pipe's surface outwards, the jacket's surface last: one more than there are layers [°C] */
  interfaceTemperatures: number[];
  /** of each layer over its own temperatures [W/(m·K)] */
  meanConductivities: number[];
  /** convection and radiation together [W/(m²·K)] */
  surfaceCoefficient: number;
  /** null where the coefficient is given */
  convectiveCoefficient: number | null;
  radiativeCoefficient: number | null;
  /** conducted less given off, over the larger */
  closure: number;
  iterations: number;
  notes: string[];
};
