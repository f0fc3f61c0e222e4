import { z } from 'zod';

import { pipeStandards } from '@/api/engine/standards/rows';

import { libraryIdSchema, thicknessNameSchema } from './build-up';

/** Where a row comes from, and how sure it is. */
const origin = { source: z.string(), confidence: z.string() };
const number = z.number();

/** A pipe or tube; outside diameter and walls in m. */
export const libraryPipeSizeSchema = z.object({
  standard: z.enum(pipeStandards),
  standardTitle: z.string(),
  nominal: z.string(),
  dn: number.nullable(),
  nominalInches: number.nullable(),
  outsideDiameter: number,
  walls: z.array(z.object({ name: z.string(), thickness: number })),
  ...origin,
});
export type LibraryPipeSize = z.infer<typeof libraryPipeSizeSchema>;

/** Mean temperature [°C] and conductivity [W/(m·K)], temperatures rising. */
export const libraryCurveSchema = z.object({
  kind: z.enum(['max', 'typical', 'design', 'measured']),
  points: z.array(z.tuple([number, number])),
  ...origin,
});
export type LibraryCurve = z.infer<typeof libraryCurveSchema>;

/** `curve` is the one that is calculated with; `otherCurves` are there to compare. Use limits in °C. */
export const libraryMaterialSchema = z.object({
  id: libraryIdSchema,
  name: z.string(),
  standards: z.string(),
  useType: z.string(),
  curve: libraryCurveSchema,
  otherCurves: z.array(libraryCurveSchema),
  useMinimum: number.nullable(),
  useMinimumSource: z.string(),
  useMaximum: number.nullable(),
  useMaximumSource: z.string(),
  closedCell: z.boolean(),
  flameSmoke: z.string().nullable(),
  /** share of the conductivity, 0.1 is ± 10 % */
  conductivityTolerance: number.nullable(),
  series: z.array(z.string()),
  notes: z.array(z.string()),
});
export type LibraryMaterial = z.infer<typeof libraryMaterialSchema>;

/** `bare`: a surface without insulation, not a finish to choose. Highest temperature in °C. */
export const libraryFinishSchema = z.object({
  id: libraryIdSchema,
  name: z.string(),
  kind: z.string(),
  bare: z.boolean(),
  emittanceNew: number,
  emittanceAged: number,
  emittanceRange: z.tuple([number, number]),
  maximum: number.nullable(),
  maximumSource: z.string(),
  ...origin,
});
export type LibraryFinish = z.infer<typeof libraryFinishSchema>;

/** Thicknesses that can be bought; `installed` is the share of a name that is left once put up. */
export const librarySeriesSchema = z.object({
  id: z.string(),
  title: z.string(),
  form: z.enum(['section', 'tube', 'sheet', 'board', 'blanket', 'liner', 'mat']),
  unit: z.enum(['in', 'mm']),
  names: z.array(thicknessNameSchema),
  tables: z.enum(['rigid', 'flexible', 'none']),
  installed: number.nullable(),
  sizes: z.string(),
  note: z.string(),
  ...origin,
});
export type LibrarySeries = z.infer<typeof librarySeriesSchema>;

const exemptionSchema = z.object({
  id: z.string(),
  what: z.string(),
  answer: z.string(),
  clause: z.string(),
  ...origin,
});

/** A band of fluid temperature [°C], its conductivity range [W/(m·K)] at a mean [°C], and a name for each column. */
const codeBandSchema = z.object({
  /** as the table prints it, in °F */
  printed: z.string(),
  from: number.nullable(),
  to: number.nullable(),
  fromIncluded: z.boolean(),
  toIncluded: z.boolean(),
  conductivity: z.tuple([number, number]),
  ratingMean: number,
  thicknesses: z.array(thicknessNameSchema.nullable()),
});

/** Least installed resistance of a duct [m²·K/W] by climate zone, in the order of `locations`. */
const codeDuctsSchema = z.object({
  name: z.string(),
  locations: z.array(z.object({ id: z.string(), words: z.string() })),
  uses: z.array(
    z.object({
      use: z.enum(['both', 'heating', 'cooling', 'return']),
      zones: z.array(z.object({ zone: number, resistances: z.array(number) })),
    }),
  ),
  exemptions: z.array(exemptionSchema),
  ...origin,
});

/** Tables as entered: to be verified against the edition that is adopted. */
export const libraryCodeSchema = z.object({
  id: z.string(),
  title: z.string(),
  pipes: z.object({ name: z.string(), columns: z.array(z.string()), bands: z.array(codeBandSchema), ...origin }),
  /** which end of the conductivity range stands in the adjustment */
  end: z.enum(['upper', 'lower']),
  endSource: z.string(),
  endConfidence: z.string(),
  ducts: codeDuctsSchema.nullable(),
  footnotes: z.array(z.string()),
  exemptions: z.array(exemptionSchema),
});
export type LibraryCode = z.infer<typeof libraryCodeSchema>;

/** Starting values for touch limits [°C], and the thresholds they rest on. */
export const librarySafetySchema = z.object({
  touchDefaults: z.array(z.object({ id: z.string(), where: z.string(), limit: number, basis: z.string(), ...origin })),
  touchThresholds: z.array(z.object({ surface: z.string(), contact: z.string(), limit: number, ...origin })),
  notes: z.array(z.string()),
});
export type LibrarySafety = z.infer<typeof librarySafetySchema>;
