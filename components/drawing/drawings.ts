// The root of one chunk: all that draws with react-native-svg and d3 is reached through here and nowhere else,
// so that the bundler keeps it out of what every page loads.
export { CurveChart } from '@/components/diagram/curve-chart';
export { NumberedSection } from '@/components/diagram/numbered-section';
export { Section } from '@/components/diagram/section';
export { ThicknessStrip } from '@/components/study/thickness-strip';
