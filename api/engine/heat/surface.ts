import type { HeatShape } from './heat-case';

/** What a surface's convection needs to know: lengths [m] of the finished surface, air [K], wind [m/s]. */
export type Surface = {
  shape: HeatShape;
  isCylinder: boolean;
  /** to which forced and natural coefficients are combined by the C680 practice */
  power: 3 | 3.5 | 4;
  /** of natural convection: the finished diameter of a horizontal cylinder, the height of vertical shapes, area over
   * perimeter of horizontal flats */
  length: number;
  /** along the wind: the diameter of cylinders, the height of vertical flats, given for horizontal ones */
  windLength: number;
  air: number;
  wind: number;
  pressureRatio: number;
};

/** Convective coefficient [W/(m²·K)] for the surface's temperature above the air's [K], either sign. */
export type Convection = (difference: number) => number;
