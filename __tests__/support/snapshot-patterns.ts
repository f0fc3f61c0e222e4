import type { Shape } from '@/api/contracts/run';
import type { DrawnSection, ScheduleRow } from '@/api/contracts/schedule';
import type { ThicknessName } from '@/api/engine/standards/thickness-name';

/** How one kind of run of the invented job is insulated. */
export type Pattern = {
  service: number;
  place: number;
  size: string;
  shape: Shape;
  material: [id: string, name: string];
  names: ThicknessName[];
  finish: string;
  retarder: ScheduleRow['vapourRetarder'];
  source: ScheduleRow['source'];
  governing: ScheduleRow['governing'];
  decides: string;
  section: DrawnSection;
};

const fibre: Pattern['material'] = ['std/mineral-fibre-pipe', 'Mineral fibre pipe section'];
const foam: Pattern['material'] = ['std/elastomeric', 'Flexible elastomeric foam'];
const glass: Pattern['material'] = ['std/cellular-glass', 'Cellular glass'];
const board: Pattern['material'] = ['std/mineral-fibre-board', 'Mineral fibre board'];

const pipe = (nominal: string, length: number): Shape => ({
  kind: 'pipe',
  size: { standard: 'asme-steel', nominal },
  length: { value: length },
  orientation: 'horizontal',
});
const cylinder = (material: string, [diameter, ...thicknesses]: number[], nature: 'hot' | 'cold'): DrawnSection => ({
  shape: 'cylinder',
  width: diameter ?? 0,
  height: diameter ?? 0,
  layers: thicknesses.map((thickness) => ({ materialId: material, thickness })),
  nature,
});
const hot = {
  retarder: 'none',
  source: 'specified',
  governing: 'energy-code',
  decides: 'the code table',
  finish: 'White PVC jacket',
} as const;
const cold = {
  retarder: 'sealed-facing',
  source: 'specified',
  governing: 'dew-point',
  decides: 'dew point and its margin',
  finish: 'White jacket, laps sealed',
} as const;

export const patterns: Pattern[] = [
  {
    ...hot,
    service: 0,
    place: 0,
    size: 'DN 80',
    shape: pipe('80', 21.44),
    material: fibre,
    names: ['in:2'],
    section: cylinder(fibre[0], [0.0889, 0.0518], 'hot'),
  },
  {
    ...hot,
    service: 0,
    place: 0,
    size: 'DN 150',
    shape: pipe('150', 17.05),
    material: fibre,
    names: ['in:1'],
    governing: 'touch',
    decides: 'touch limit: 25 mm reaches 63.1 °C',
    source: 'chosen',
    section: cylinder(fibre[0], [0.1683, 0.0259], 'hot'),
  },
  {
    ...hot,
    service: 1,
    place: 1,
    size: 'DN 50',
    shape: pipe('50', 46.27),
    material: fibre,
    names: ['in:1.5'],
    finish: 'White jacket, laps sealed',
    section: cylinder(fibre[0], [0.0603, 0.0401], 'hot'),
  },
  {
    ...hot,
    service: 1,
    place: 1,
    size: 'DN 20',
    shape: pipe('20', 8.349),
    material: foam,
    names: ['in:1'],
    finish: 'The foam’s own skin',
    source: 'proposed',
    section: cylinder(foam[0], [0.0267, 0.0264], 'hot'),
  },
  {
    ...cold,
    service: 2,
    place: 1,
    size: 'DN 100',
    shape: pipe('100', 33.951),
    material: foam,
    names: ['in:1'],
    retarder: 'closed-cell',
    finish: 'The foam’s own skin',
    section: cylinder(foam[0], [0.1143, 0.0256], 'cold'),
  },
  {
    ...cold,
    service: 2,
    place: 2,
    size: 'DN 150',
    shape: pipe('150', 64.25),
    material: glass,
    names: ['in:2', 'in:1.5'],
    retarder: 'mastic-and-mesh',
    finish: 'White-painted aluminium',
    decides: 'heat flow under 18 W/m',
    governing: 'heat-flow',
    section: cylinder(glass[0], [0.1683, 0.0519, 0.0381], 'cold'),
  },
  {
    ...cold,
    service: 3,
    place: 1,
    size: '600 × 400 mm',
    shape: { kind: 'rectangular-duct', width: { value: 0.6 }, height: { value: 0.4 }, length: { value: 38.4 } },
    material: ['std/mineral-fibre-wrap', 'Mineral fibre duct wrap'],
    names: ['in:2'],
    section: {
      shape: 'rectangle',
      width: 0.6,
      height: 0.4,
      layers: [{ materialId: 'std/mineral-fibre-wrap', thickness: 0.0381 }],
      nature: 'cold',
    },
  },
  {
    ...cold,
    service: 3,
    place: 2,
    size: 'Ø 315 mm',
    shape: { kind: 'round-duct', diameter: { value: 0.315 }, length: { value: 12.2 } },
    material: board,
    names: ['mm:50'],
    finish: 'White-painted aluminium',
    section: cylinder(board[0], [0.315, 0.05], 'cold'),
  },
  {
    ...hot,
    service: 1,
    place: 0,
    size: 'Vessel Ø 900 × 1,900 mm',
    shape: {
      kind: 'vessel',
      diameter: { value: 0.9 },
      length: { value: 1.9 },
      orientation: 'vertical',
      ends: 'domed',
      count: 2,
    },
    material: board,
    names: ['in:2'],
    finish: 'Aluminium sheet',
    section: {
      shape: 'wall',
      width: 0.9,
      height: 0.9,
      layers: [{ materialId: board[0], thickness: 0.0508 }],
      nature: 'hot',
    },
  },
  {
    ...cold,
    service: 4,
    place: 1,
    size: 'DN 25',
    shape: pipe('25', 19.9),
    material: foam,
    names: ['in:0.75'],
    retarder: 'closed-cell',
    finish: 'The foam’s own skin',
    section: cylinder(foam[0], [0.0334, 0.0197], 'cold'),
  },
];
