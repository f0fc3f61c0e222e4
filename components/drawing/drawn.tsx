import { lazy, Suspense, type ComponentProps } from 'react';
import { View } from 'react-native';

const load = () => import('./drawings');

/** Fetches what draws ahead of the first drawing; without a network the first drawing asks again. */
export const fetchDrawings = (): void => void load().catch(() => undefined);

const CurveChart = lazy(() => load().then((drawings) => ({ default: drawings.CurveChart })));
const NumberedSection = lazy(() => load().then((drawings) => ({ default: drawings.NumberedSection })));
const Section = lazy(() => load().then((drawings) => ({ default: drawings.Section })));
const ThicknessStrip = lazy(() => load().then((drawings) => ({ default: drawings.ThicknessStrip })));

/** The cut pipe, duct or wall, to scale. */
export const DrawnSection = (props: ComponentProps<typeof Section>) => (
  <Suspense fallback={<View style={{ width: props.size, height: props.size }} />}>
    <Section {...props} />
  </Suspense>
);

/** A section, large, with its interfaces numbered. */
export const DrawnNumberedSection = (props: ComponentProps<typeof NumberedSection>) => (
  <Suspense fallback={<View style={{ width: 280, height: 280 }} />}>
    <NumberedSection {...props} />
  </Suspense>
);

/** Curves through their points. */
export const DrawnCurves = (props: ComponentProps<typeof CurveChart>) => (
  <Suspense fallback={<View style={{ height: 280 }} />}>
    <CurveChart {...props} />
  </Suspense>
);

/** Every thickness that is made, growing from left to right. */
export const DrawnStrip = (props: ComponentProps<typeof ThicknessStrip>) => (
  <Suspense fallback={<View style={{ height: 420 }} />}>
    <ThicknessStrip {...props} />
  </Suspense>
);
