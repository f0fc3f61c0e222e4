import type { CurvePoint } from '../standards/rows';

/** Points [mean temperature °C, conductivity W/(m·K)], temperatures rising, at least one. */
type Points = readonly CurvePoint[];

/**
 * Conductivity at a temperature: piecewise linear through the published points. Below the first point its value is
 * held; above the last the last segment goes on with its slope, but never a falling one; one point is a constant.
 *
 * @param points - n points [°C, W/(m·K)]
 * @param temperature - [°C]
 * @returns [W/(m·K)]
 * @source rule of this engine outside the points; within them as ASTM C680 takes a curve
 */
export const conductivityAt = (points: Points, temperature: number): number =>
  onSegment(points, segmentBelow(points, temperature), temperature);

/**
 * Temperature drop through a layer that the curve's integral needs to reach a given amount: the δ for which
 * ∫ k dT from T − δ to T is I. In closed form, segment by segment: within one, k₀δ − s δ²/2 = I gives
 * δ = 2I / (k₀ + √(k₀² − 2 s I)), which loses no digits where I is small.
 *
 * @param points - n points [°C, W/(m·K)]
 * @param from - temperature at the layer's inner side [°C]
 * @param integral - I [W/m]: heat flow times ln(r₂/r₁)/2π or times thickness; negative when heat flows inward
 * @returns δ [K], with the sign of I
 * @source Fourier's law under the Kirchhoff transform: H. S. Carslaw and J. C. Jaeger, Conduction of Heat in Solids,
 *   2nd ed., Oxford, 1959, sec. 1.6 (from memory)
 */
export function dropFor(points: Points, from: number, integral: number): number {
  const step = integral < 0 ? 1 : -1; // the way the temperature goes
  let left = Math.abs(integral);
  let temperature = from;
  let drop = 0;
  for (let place = startingSegment(points, from, step); ; place += step) {
    const conductivity = onSegment(points, place, temperature);
    const slope = slopeOf(points, place) * step;
    const end = endTowards(points, place, step);
    const width = Math.abs(end - temperature);
    const whole = (conductivity + (slope * width) / 2) * width;
    if (!(left > whole)) {
      return -step * (drop + (2 * left) / (conductivity + Math.sqrt(conductivity * conductivity + 2 * slope * left)));
    }
    left -= whole;
    drop += width;
    temperature = end;
  }
}

/** Whether all temperatures between two lie within the published points. */
export const isWithin = (points: Points, one: number, other: number): boolean =>
  Math.min(one, other) >= temperatureOf(points, 0) && Math.max(one, other) <= temperatureOf(points, points.length - 1);

/** Segment 0 starts at the first point; -1 lies below it and n - 1 above the last. */
function segmentBelow(points: Points, temperature: number): number {
  let place = points.length - 1;
  while (place >= 0 && temperatureOf(points, place) > temperature) place -= 1;
  return place;
}

/** A temperature on a point belongs to the segment that the heat's way leads into. */
function startingSegment(points: Points, from: number, step: number): number {
  const place = segmentBelow(points, from);
  return step < 0 && place >= 0 && temperatureOf(points, place) === from ? place - 1 : place;
}

function onSegment(points: Points, place: number, temperature: number): number {
  const start = Math.max(place, 0);
  return valueOf(points, start) + slopeOf(points, place) * (temperature - temperatureOf(points, start));
}

function slopeOf(points: Points, place: number): number {
  const last = points.length - 1;
  if (place < 0 || last === 0) return 0;
  return place < last ? between(points, place) : Math.max(0, between(points, last - 1));
}

const between = (points: Points, place: number): number =>
  (valueOf(points, place + 1) - valueOf(points, place)) /
  (temperatureOf(points, place + 1) - temperatureOf(points, place));

/** Where a segment ends on the way; the outer ones have no end. */
function endTowards(points: Points, place: number, step: number): number {
  const end = step < 0 ? place : place + 1;
  return end < 0 || end >= points.length ? Infinity * step : temperatureOf(points, end);
}

const temperatureOf = (points: Points, place: number): number => points[place]?.[0] ?? NaN;
const valueOf = (points: Points, place: number): number => points[place]?.[1] ?? NaN;
