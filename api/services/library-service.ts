import type {
  LibraryFinish,
  LibraryMaterial,
  LibraryPipeSize,
  LibrarySafety,
  LibrarySeries,
} from '@/api/contracts/library';
import { codeEditions } from '@/api/engine/standards/energy-codes';
import { finishes } from '@/api/engine/standards/finishes';
import { materials } from '@/api/engine/standards/materials';
import { pipeSizes, pipeStandardTitle } from '@/api/engine/standards/pipe-sizes';
import type { Curve } from '@/api/engine/standards/rows';
import { thicknessSeries } from '@/api/engine/standards/thickness-series';
import {
  touchDefaults,
  touchNotes,
  touchThresholds,
  touchThresholdsOrigin,
} from '@/api/engine/standards/touch-defaults';

import { toLibraryCode } from './library-codes';

/** The standard rows as everyone sees them: the same for every firm, each with its source. */
export const createLibraryService = () => ({
  pipeSizes: (): LibraryPipeSize[] =>
    pipeSizes().map((size) => ({ ...size, standardTitle: pipeStandardTitle(size.standard) })),
  materials: (): LibraryMaterial[] =>
    materials().map((material) => ({
      ...material,
      id: standardId(material.id),
      curve: toCurve(material.curve),
      otherCurves: material.otherCurves.map(toCurve),
      series: [...material.series],
      notes: [...material.notes],
    })),
  finishes: (): LibraryFinish[] =>
    finishes().map((finish) => ({
      ...finish,
      id: standardId(finish.id),
      emittanceRange: [...finish.emittanceRange],
    })),
  series: (): LibrarySeries[] => thicknessSeries().map(({ fits: _fits, ...series }) => series),
  codes: () => codeEditions().map(toLibraryCode),
  safety: (): LibrarySafety => ({
    touchDefaults: [...touchDefaults()],
    touchThresholds: touchThresholds().map((threshold) => ({ ...threshold, ...touchThresholdsOrigin })),
    notes: [...touchNotes()],
  }),
});
export type LibraryService = ReturnType<typeof createLibraryService>;

const standardId = (id: string) => `std/${id}`;

const toCurve = ({ points, ...curve }: Curve) => ({
  ...curve,
  points: points.map(([mean, conductivity]): [number, number] => [mean, conductivity]),
});
