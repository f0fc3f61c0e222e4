/** What draws, at once: jest does not fetch the chunk that the browser fetches. In the place of `components/drawing/drawn`. */
export {
  CurveChart as DrawnCurves,
  NumberedSection as DrawnNumberedSection,
  Section as DrawnSection,
  ThicknessStrip as DrawnStrip,
} from '@/components/drawing/drawings';
