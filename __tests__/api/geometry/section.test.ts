import * as fc from 'fast-check';

import { interfaceMarks, markRadius } from '@/api/geometry/interface-marks';
import { extentOf, section, sectionToScale, type SectionInput } from '@/api/geometry/section';

import { isWithin, outlineBox, pointsOf } from './path-points';

// The checks here are plain geometry: what is drawn follows from the numbers that are drawn.
const materials = ['std/mf_pipe', 'std/mf_blanket_wrap', 'std/mf_board', 'std/cellular_glass', 'std/elastomeric'];
const others = ['std/polyolefin', 'std/calsil', 'std/perlite', 'std/pir', 'std/aerogel', 'own/felt'];
const layers = fc.array(
  fc.record({
    materialId: fc.constantFrom(...materials, ...others),
    thickness: fc.double({ min: 0.009, max: 0.13, noNaN: true }),
  }),
  { maxLength: 3 },
);
const side = fc.double({ min: 0.012, max: 0.9, noNaN: true });
const nature = fc.constantFrom('hot' as const, 'cold' as const);
const cylinder = fc
  .record({ width: side, layers, nature })
  .map((drawn): SectionInput => ({ ...drawn, shape: 'cylinder', height: drawn.width }));
const duct = fc
  .record({ width: side, height: side, layers, nature })
  .map((drawn): SectionInput => ({ ...drawn, shape: 'rectangle' }));
const wall = fc
  .record({ width: side, height: side, layers, nature })
  .map((drawn): SectionInput => ({ ...drawn, shape: 'wall' }));
const any = fc.oneof(cylinder, duct, wall);
const size = fc.constantFrom(28, 120, 280);
/** coordinates are rounded to a tenth */
const rounding = 0.11;

const pipe = (thicknesses: number[]): SectionInput => ({
  shape: 'cylinder',
  width: 0.1143,
  height: 0.1143,
  layers: thicknesses.map((thickness) => ({ materialId: 'std/mf_pipe', thickness })),
  nature: 'hot',
});

it('is to scale: 114.3 mm pipe under 38 mm is 190.3 mm over all, and the bore keeps its share', () => {
  const { bore, jacket, scale, size: drawn } = section(pipe([0.038]), 280);
  expect(drawn).toBe(280);
  expect(outlineBox(jacket).width).toBeCloseTo(277, 0);
  expect(outlineBox(bore.outline).width / outlineBox(jacket).width).toBeCloseTo(114.3 / 190.3, 2);
  expect(scale * 0.1903).toBeCloseTo(277, 6);
});

it('draws every layer at its own thickness, in one scale', () => {
  const { interfaces, scale } = section(pipe([0.0635, 0.0508]), 280);
  const [bore, inner, outer] = interfaces;
  expect((inner! - bore!) / scale).toBeCloseTo(0.0635, 3);
  expect((outer! - inner!) / scale).toBeCloseTo(0.0508, 3);
});

it('shows a thicker insulation larger at a given scale, and the same pipe in the same size', () => {
  const [thin, thick] = [sectionToScale(pipe([0.025]), 400), sectionToScale(pipe([0.076]), 400)];
  expect(thick.box.width - thin.box.width).toBeCloseTo(2 * 0.051 * 400, 5);
  expect(outlineBox(thick.bore.outline).width).toBeCloseTo(outlineBox(thin.bore.outline).width, 0);
});

it('stays inside its square, and fills it on its longer side', () => {
  fc.assert(
    fc.property(any, size, (drawn, square) => {
      const drawing = section(drawn, square);
      const paths = [drawing.jacket, drawing.bore.outline, ...drawing.layers.map(({ outline }) => outline)];
      for (const path of paths) {
        const { left, top, right, bottom } = outlineBox(path);
        expect(Math.min(left, top)).toBeGreaterThanOrEqual(0);
        expect(Math.max(right, bottom)).toBeLessThanOrEqual(square);
      }
      const extent = extentOf(drawn);
      expect(Math.max(extent.width, extent.height) * drawing.scale).toBeGreaterThan(square - 3.5);
    }),
  );
});

it('nests its layers: each begins where the one before ends', () => {
  fc.assert(
    fc.property(any, size, (drawn, square) => {
      const { interfaces, scale } = section(drawn, square);
      expect(interfaces).toHaveLength(drawn.layers.length + 1);
      drawn.layers.forEach(({ thickness }, index) => {
        expect(Math.abs(interfaces[index + 1]! - interfaces[index]! - thickness * scale)).toBeLessThan(rounding);
      });
    }),
  );
});

it('keeps every hatch of a cylinder inside its own annulus', () => {
  fc.assert(
    fc.property(cylinder, size, (drawn, square) => {
      const drawing = section(drawn, square);
      const centre = square / 2;
      drawing.layers.forEach(({ hatch }, index) => {
        const [inner, outer] = [drawing.interfaces[index]! - centre, drawing.interfaces[index + 1]! - centre];
        const radii = pointsOf(hatch).map(([x, y]) => Math.hypot(x - centre, y - centre));
        expect(radii.filter((radius) => radius < inner - 2 * rounding || radius > outer + 2 * rounding)).toEqual([]);
      });
    }),
  );
});

it('keeps every hatch of a duct around the metal and within its layer', () => {
  fc.assert(
    fc.property(duct, size, (drawn, square) => {
      const drawing = section(drawn, square);
      let inner = outlineBox(drawing.bore.outline);
      for (const { hatch, outline } of drawing.layers) {
        const [metal, outer] = [inner, outlineBox(outline)];
        const strays = pointsOf(hatch).filter(
          (point) => isWithin(metal, point, rounding) || !isWithin(outer, point, -rounding),
        );
        expect(strays).toEqual([]);
        inner = outer;
      }
    }),
  );
});

it('keeps the hatch of a wall between its faces', () => {
  fc.assert(
    fc.property(wall, size, (drawn, square) => {
      for (const { hatch, outline } of section(drawn, square).layers) {
        const strays = pointsOf(hatch).filter((point) => !isWithin(outlineBox(outline), point, -rounding));
        expect(strays).toEqual([]);
      }
    }),
  );
});

it('is the same every time', () => {
  fc.assert(
    fc.property(any, size, (drawn, square) =>
      expect(JSON.stringify(section(drawn, square))).toBe(JSON.stringify(section(drawn, square))),
    ),
  );
});

it('hatches each family of materials in a way of its own', () => {
  const hatches = [...materials, ...others].map((materialId) => {
    const drawn: SectionInput = { ...pipe([]), layers: [{ materialId, thickness: 0.051 }] };
    return section(drawn, 120).layers[0]!.hatch;
  });
  expect(new Set(hatches).size).toBe(hatches.length);
  expect(hatches.every((hatch) => hatch.length > 0)).toBe(true);
});

it('is cheap beside a run: 500 glyphs are less than a megabyte of paths', () => {
  const worst = Math.max(
    ...[...materials, ...others].map(
      (materialId) => JSON.stringify(section({ ...pipe([]), layers: [{ materialId, thickness: 0.1 }] }, 28)).length,
    ),
  );
  expect(worst).toBeLessThan(2000);
});

it('draws a bare pipe as a bore alone, and its edge is the jacket', () => {
  const bare = section(pipe([]), 28);
  expect(bare.layers).toEqual([]);
  expect(bare.jacket).toBe(bare.bore.outline);
});

it('numbers every interface apart from its neighbours, beside the interface and within the square', () => {
  fc.assert(
    fc.property(any, (drawn) => {
      const drawing = section(drawn, 280);
      const marks = interfaceMarks(drawing);
      expect(marks.map(({ x }) => x)).toEqual(drawing.interfaces);
      marks.forEach(({ markY }, index) => {
        if (index > 0) expect(markY - marks[index - 1]!.markY).toBeGreaterThan(2 * markRadius);
        expect(markY).toBeGreaterThan(markRadius);
        expect(markY).toBeLessThan(280 - markRadius);
      });
    }),
  );
});
