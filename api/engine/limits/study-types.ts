import type { Finish, Material, PipeStandard, VapourRetarder } from '../standards/rows';
import type { ThicknessName } from '../standards/thickness-name';
import type { Words } from '../words';

export type Orientation = 'horizontal' | 'vertical';

/** What is insulated; lengths in m. `nominal` with its standard finds made diameters and code columns; null: a free diameter. */
export type Body =
  | {
      shape: 'pipe';
      standard: PipeStandard | null;
      nominal: string | null;
      outsideDiameter: number;
      orientation: Orientation;
      height: number | null;
    }
  | { shape: 'round-duct'; diameter: number }
  | { shape: 'rectangular-duct'; width: number; height: number }
  | { shape: 'vessel'; diameter: number; length: number; orientation: Orientation }
  | { shape: 'flat'; height: number };

/** One layer: `thickness` null on the outermost where nothing is specified; `installed` [m] is a wrap's thickness as put up. */
export type LayerInput = { material: Material; thickness: ThicknessName | null; installed: number | null };

/** A fluid's temperatures in one state of the service [°C]; a dual-temperature service has two. */
export type FluidState = { nature: 'hot' | 'cold'; operating: number; lowest: number; highest: number };

/** Air [°C], relative humidity [%], wind [m/s], and who says so. */
export type Conditions = { air: number; humidity: number | null; wind: number; source: string };
export const conditionSets = ['hottest', 'mostHumid', 'coldest', 'warmest', 'mean'] as const;
export type ConditionSet = (typeof conditionSets)[number];

export const reaches = ['nobody', 'trained', 'public'] as const;
export type Reach = (typeof reaches)[number];

export type PlaceInput = {
  name: string;
  reach: Reach;
  touchLimit: number | null;
  touchLimitSource: string;
  outdoor: boolean;
  plenum: boolean;
  ductLocation: string | null;
  conditions: Record<ConditionSet, Conditions>;
};

export const limitKinds = ['touch', 'dew-point', 'energy-code', 'heat-flow', 'material'] as const;
export type LimitKind = (typeof limitKinds)[number];

/** The limits that apply to the service here, with their values: K; W/m or W/m². */
export type LimitInput =
  | { kind: 'touch' }
  | { kind: 'dew-point'; margin: number }
  | { kind: 'energy-code' }
  | { kind: 'heat-flow'; perLength: number | null; flux: number | null }
  | { kind: 'material' };

export type SurfaceMethod = 'astm-c680' | 'iso-12241';

export type StudyInput = {
  body: Body;
  layers: readonly LayerInput[];
  finish: Finish;
  vapourRetarder: VapourRetarder;
  states: readonly FluidState[];
  place: PlaceInput;
  limits: readonly LimitInput[];
  codeEdition: string;
  climateZone: string;
  codeExempt: string | null;
  altitude: number;
  method: SurfaceMethod;
  /** which made series is offered where no thickness is specified */
  seriesUnit: 'in' | 'mm';
};

export type Verdict = 'met' | 'not-met' | 'does-not-apply' | 'cannot-tell';

/** What a verdict was judged at. */
export type JudgedAt = {
  set: ConditionSet;
  fluid: number;
  air: number;
  humidity: number | null;
  wind: number;
  emittance: number;
  source: string;
};

export type LimitVerdict = {
  kind: LimitKind;
  verdict: Verdict;
  /** why it does not apply or cannot be told; or what was compared */
  because: Words;
  /** surface [°C], thickness [m], W/m, W/m², m²·K/W: as `unit` says */
  value: number | null;
  limit: number | null;
  margin: number | null;
  unit: 'temperature' | 'difference' | 'dimension' | 'heatPerLength' | 'heatFlux' | 'resistance' | null;
  state: 'dry' | 'marginal' | 'sweats' | null;
  /** dew point [°C] and the humidity [%] at which sweating begins */
  dewPoint: number | null;
  sweatsFrom: number | null;
  judgedAt: JudgedAt | null;
  source: string;
};

/** Heat and surface under one set of conditions: W/m for cylinders and rectangular ducts (null for flats), W/m² at the jacket. */
export type HeatAnswer = {
  heatFlow: number | null;
  flux: number;
  surface: number;
  interfaces: number[];
  meanConductivities: number[];
  coefficient: number;
  convective: number;
  radiative: number;
  closure: number;
  judgedAt: JudgedAt;
  notes: string[];
};

/** One made thickness of the outermost layer; `name` null is the bare surface. Diameters and thicknesses in m. */
export type Candidate = {
  name: ThicknessName | null;
  /** names of all layers from the inside out; empty when bare */
  names: ThicknessName[];
  /** outside diameter of the finished insulation; null for flats and rectangular ducts */
  outsideDiameter: number | null;
  layerThicknesses: number[];
  basis: 'made' | 'nominal' | 'bare';
  heat: HeatAnswer;
  verdicts: LimitVerdict[];
  meetsAll: boolean;
  notes: string[];
};

export type Study = {
  candidates: Candidate[];
  /** places in `candidates`; null where there is none */
  specified: number | null;
  proposed: number | null;
  /** forbids the next thinner of the proposed (or, when nothing meets all, is never met) */
  governing: LimitKind | null;
  /** thinnest made that meets this one limit, for each limit that applies */
  meets: { kind: LimitKind; candidate: number | null }[];
  sentence: Words;
  whyNotThinner: Words;
  engineVersion: string;
  method: SurfaceMethod;
  notes: string[];
};

/** The working of one number: each step with its equation, its values put in, and where they come from. */
export type WorkingInput = { symbol: string; meaning: string; value: Words; source: string };
export type WorkingStep = {
  title: string;
  equation: string;
  filled: Words;
  result: Words;
  inputs: WorkingInput[];
  source: string;
};
export type Working = { title: string; steps: WorkingStep[]; notes: string[]; engineVersion: string };
