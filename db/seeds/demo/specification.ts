import type { BodyKind, Layer, SpecificationRowInput } from '@/api/contracts/build-up';

import type { PlaceKey } from './places';
import type { ServiceKey } from './services';
import { millimetres } from './typed';

/** A row as the engineer handed it down; places and service by key until they have ids. */
export type DemoRow = Omit<SpecificationRowInput, 'serviceId' | 'placeIds'> & {
  service: ServiceKey;
  places: PlaceKey[];
};

type Name = NonNullable<Layer['thickness']>;
export const layer = (material: string, thickness: Name | null, installed?: string): Layer => ({
  materialId: `std/${material}`,
  thickness,
  installed: installed === undefined ? null : millimetres(installed),
});

type Band = [fromDn: number, toDn: number] | null;
type Put = { material: string; names: Name[]; finish: string; note?: string; installed?: string };
type Covering = Put & { retarder?: DemoRow['vapourRetarder'] };
type Where = { label: string; service: ServiceKey; places: PlaceKey[]; appliesTo?: BodyKind; band?: Band };

const row = ({ label, service, places, appliesTo = 'pipe', band = null }: Where, put: Covering): DemoRow => ({
  label,
  service,
  places,
  appliesTo,
  fromDn: band?.[0] ?? null,
  toDn: band?.[1] ?? null,
  layers: put.names.map((name) => layer(put.material, name, put.installed)),
  finishId: `std/${put.finish}`,
  vapourRetarder: put.retarder ?? 'none',
  note: put.note ?? '',
});

/** Pipes, as they stood before the addendum: P22 bright, no P23. */
export const demoPipeRows = [
  row(
    { label: 'P01', service: 'steam', places: ['plant-room'], band: [40, 200] },
    { material: 'mf_pipe', names: ['in:2'], finish: 'pvc-jacket' },
  ),
  row(
    { label: 'P02', service: 'steam', places: ['tunnel'], band: [65, 200] },
    { material: 'mf_pipe', names: ['in:3'], finish: 'aluminium-sheet' },
  ),
  row(
    { label: 'P03', service: 'condensate', places: ['plant-room'], band: [15, 65] },
    { material: 'mf_pipe', names: ['in:2.5'], finish: 'pvc-jacket' },
  ),
  row(
    { label: 'P04', service: 'condensate', places: ['tunnel'], band: [15, 65] },
    { material: 'mf_pipe', names: ['in:2.5'], finish: 'aluminium-sheet' },
  ),
  row(
    { label: 'P05', service: 'heating-flow', places: ['ceiling-void'], band: [15, 32] },
    { material: 'mf_pipe', names: ['in:1.5'], finish: 'all-service-jacket' },
  ),
  row(
    { label: 'P06', service: 'heating-flow', places: ['ceiling-void'], band: [40, 100] },
    { material: 'mf_pipe', names: ['in:2'], finish: 'all-service-jacket' },
  ),
  row(
    { label: 'P07', service: 'heating-flow', places: ['ward-corridor'], band: [15, 32] },
    { material: 'mf_pipe', names: ['in:1.5'], finish: 'pvc-jacket', note: 'Exposed within reach: PVC' },
  ),
  row(
    { label: 'P08', service: 'heating-flow', places: ['plant-room'], band: [40, 150] },
    { material: 'mf_pipe', names: ['in:2'], finish: 'pvc-jacket' },
  ),
  row(
    { label: 'P09', service: 'heating-return', places: ['ceiling-void'], band: [15, 32] },
    { material: 'mf_pipe', names: ['in:1.5'], finish: 'all-service-jacket' },
  ),
  row(
    { label: 'P10', service: 'heating-return', places: ['ceiling-void'], band: [40, 100] },
    { material: 'mf_pipe', names: ['in:2'], finish: 'all-service-jacket' },
  ),
  row(
    { label: 'P11', service: 'heating-return', places: ['plant-room'], band: [40, 150] },
    { material: 'mf_pipe', names: ['in:2'], finish: 'pvc-jacket' },
  ),
  row(
    { label: 'P12', service: 'domestic-hot', places: ['ceiling-void'], band: [15, 32] },
    { material: 'mf_pipe', names: ['in:1'], finish: 'all-service-jacket' },
  ),
  row(
    { label: 'P13', service: 'domestic-hot', places: ['ceiling-void', 'crawl-space'], band: [40, 80] },
    { material: 'mf_pipe', names: ['in:1.5'], finish: 'all-service-jacket' },
  ),
  row(
    { label: 'P14', service: 'domestic-hot', places: ['plant-room'], band: [40, 80] },
    { material: 'mf_pipe', names: ['in:1.5'], finish: 'pvc-jacket' },
  ),
  row(
    { label: 'P15', service: 'domestic-cold', places: ['ceiling-void'], band: [15, 15] },
    { material: 'mf_pipe', names: ['in:0.5'], finish: 'all-service-jacket', retarder: 'sealed-facing' },
  ),
  row(
    { label: 'P16', service: 'domestic-cold', places: ['ceiling-void', 'crawl-space'], band: [20, 50] },
    { material: 'mf_pipe', names: ['in:1'], finish: 'all-service-jacket', retarder: 'sealed-facing' },
  ),
  row(
    { label: 'P17', service: 'domestic-cold', places: ['laundry'], band: [20, 50] },
    {
      material: 'mf_pipe',
      names: ['in:1'],
      finish: 'pvc-jacket',
      retarder: 'sealed-facing',
      note: 'Wash-down: sealed PVC over the sealed facing',
    },
  ),
  row(
    { label: 'P18', service: 'domestic-cold', places: ['roof'], band: [20, 50] },
    { material: 'mf_pipe', names: ['in:1'], finish: 'weathered-aluminium', retarder: 'sealed-facing' },
  ),
  row(
    { label: 'P19', service: 'chilled', places: ['plant-room'], band: [40, 200] },
    { material: 'mf_pipe', names: ['in:2'], finish: 'pvc-jacket', retarder: 'sealed-facing' },
  ),
  row(
    { label: 'P20', service: 'chilled', places: ['ceiling-void'], band: [15, 25] },
    { material: 'elastomeric', names: ['in:1'], finish: 'elastomeric-skin', retarder: 'closed-cell' },
  ),
  row(
    { label: 'P21', service: 'chilled', places: ['ceiling-void'], band: [32, 100] },
    {
      material: 'mf_pipe',
      names: ['in:1.5'],
      finish: 'all-service-jacket',
      retarder: 'sealed-facing',
      note: 'Inserts and shields at every hanger, by the pipe contractor',
    },
  ),
  row(
    { label: 'P22', service: 'chilled', places: ['roof'], band: [125, 200] },
    { material: 'cellular_glass', names: ['in:2'], finish: 'aluminium-sheet', retarder: 'mastic-and-mesh' },
  ),
  row(
    { label: 'P24', service: 'refrigerant-suction', places: ['roof'], band: [32, 32] },
    {
      material: 'elastomeric',
      names: ['in:1'],
      finish: 'weathered-aluminium',
      retarder: 'closed-cell',
      note: 'Sunlight: the foam needs a cover outdoors',
    },
  ),
  row(
    { label: 'P25', service: 'refrigerant-suction', places: ['ceiling-void'], band: [25, 32] },
    { material: 'elastomeric', names: ['in:1.5'], finish: 'elastomeric-skin', retarder: 'closed-cell' },
  ),
  row(
    { label: 'P26', service: 'refrigerant-suction', places: ['ceiling-void'], band: [15, 20] },
    { material: 'elastomeric', names: ['in:0.75'], finish: 'elastomeric-skin', retarder: 'closed-cell' },
  ),
];

export const demoDuctRows = [
  row(
    { label: 'Q01', service: 'supply-air', places: ['ceiling-void'], appliesTo: 'duct' },
    {
      material: 'mf_blanket_wrap',
      names: ['in:2'],
      finish: 'all-service-jacket',
      retarder: 'sealed-facing',
      installed: '38.1',
      note: 'Judged at its installed thickness (25 % compression)',
    },
  ),
  row(
    { label: 'Q02', service: 'supply-air', places: ['plant-room'], appliesTo: 'duct' },
    {
      material: 'mf_board',
      names: ['in:2'],
      finish: 'all-service-jacket',
      retarder: 'sealed-facing',
      note: 'Board on pins, corner angles',
    },
  ),
  row(
    { label: 'Q03', service: 'supply-air', places: ['roof'], appliesTo: 'duct' },
    { material: 'mf_board', names: ['in:2'], finish: 'aluminium-sheet', retarder: 'mastic-and-mesh' },
  ),
  row(
    { label: 'Q04', service: 'outside-air', places: ['intake-void'], appliesTo: 'duct' },
    {
      material: 'mf_board',
      names: ['in:1.5'],
      finish: 'foil-scrim-kraft',
      retarder: 'sealed-facing',
      note: 'Board, not wrap: the air is below the use limit of wrap',
    },
  ),
];

export const demoEquipmentRows = [
  row(
    { label: 'T01', service: 'domestic-hot', places: ['plant-room'], appliesTo: 'equipment' },
    { material: 'mf_board', names: ['in:2'], finish: 'aluminium-sheet' },
  ),
  row(
    { label: 'T02', service: 'condensate', places: ['plant-room'], appliesTo: 'equipment' },
    { material: 'mf_board', names: ['in:2.5'], finish: 'aluminium-sheet' },
  ),
  row(
    { label: 'T03', service: 'chilled', places: ['plant-room'], appliesTo: 'equipment' },
    { material: 'elastomeric', names: ['in:1.5'], finish: 'elastomeric-skin', retarder: 'closed-cell' },
  ),
  row(
    { label: 'T04', service: 'steam', places: ['plant-room'], appliesTo: 'equipment' },
    { material: 'glass_needle_mat', names: ['in:2'], finish: 'silicone-glass-cloth' },
  ),
];

/** What Addendum 1 does to the specification. */
export const demoAddedRows = [
  row(
    { label: 'P23', service: 'chilled', places: ['roof'], band: [80, 100] },
    {
      material: 'cellular_glass',
      names: ['in:1.5', 'in:1.5'],
      finish: 'white-painted-aluminium',
      retarder: 'mastic-and-mesh',
      note: 'Added by Addendum 1: 76 mm in two layers, joints staggered',
    },
  ),
];
export const demoChangedRows: Record<string, Partial<Pick<DemoRow, 'finishId' | 'note'>>> = {
  P22: { finishId: 'std/white-painted-aluminium', note: 'Revision A: bright aluminium; finish changed by Addendum 1' },
  Q03: { note: 'Addendum 1 speaks of chilled water only: the duct stays bright' },
};
