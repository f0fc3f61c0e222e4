import { rounded } from './outlines';
import type { SectionDrawing } from './section';

/** A number that stands for an interface: where the interface is cut by the level line, and where its number stands. */
export type InterfaceMark = { x: number; y: number; markY: number };

/** Radius of a number's circle, and the step by which neighbours are kept apart however thin a layer is. */
export const markRadius = 9;
const step = 26;

/** One mark for each interface, from the bore outwards, stepping down so that no two of them touch. */
export function interfaceMarks({ interfaces, box }: SectionDrawing): InterfaceMark[] {
  const level = rounded(box.y + box.height / 2);
  return interfaces.map((x, index) => ({
    x,
    y: level,
    markY: rounded(level + (index - (interfaces.length - 1) / 2) * step),
  }));
}
