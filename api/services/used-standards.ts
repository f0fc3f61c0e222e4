import { quantities } from '@/api/contracts/quantities';
import type { UsedStandard } from '@/api/contracts/revision';
import type { Run } from '@/api/contracts/run';
import { findCodeEdition } from '@/api/engine/standards/energy-codes';
import { finish } from '@/api/engine/standards/library';
import { pipeStandardTitle } from '@/api/engine/standards/pipe-sizes';
import type { Curve, Material } from '@/api/engine/standards/rows';
import { findSeries } from '@/api/engine/standards/thickness-series';
import { touchThresholdsOrigin } from '@/api/engine/standards/touch-defaults';

import type { Judged } from './judged';
import { standardSize } from './sizes';

/** Every row of the library that a job's results rest on, once, with its source and how sure it is. */
export function usedStandards(judged: readonly Judged[], codeEdition: string): UsedStandard[] {
  const used = [
    ...judged.flatMap(materialsOf),
    ...judged.flatMap(finishOf),
    ...judged.flatMap(({ run }) => sizeOf(run)),
    ...judged.flatMap(seriesOf),
    ...codeOf(codeEdition),
    ...(judged.some(isJudgedForTouch) ? [touchThresholds] : []),
  ];
  return [...new Map(used.map((row) => [`${row.kind} ${row.id}`, row])).values()];
}

const materialsUsed = ({ input }: Judged): Material[] => input?.layers.map(({ material }) => material) ?? [];

const materialsOf = (judged: Judged): UsedStandard[] =>
  materialsUsed(judged).map(({ id, name, standards, curve }) => ({
    id: `std/${id}`,
    kind: 'material',
    name,
    detail: [standards, curveWords(curve)].filter(Boolean).join('; '),
    source: curve.source,
    confidence: curve.confidence,
  }));

const curveKinds = {
  max: 'specification maximum',
  typical: 'typical',
  design: 'design',
  measured: 'measured',
} as const;
const curveWords = ({ kind, points }: Curve): string =>
  `${curveKinds[kind]} curve: ${points.map(([mean, conductivity]) => `${conductivity} at ${mean} ${quantities.temperature.SI.label}`).join(', ')}, ${quantities.conductivity.SI.label}`;

function finishOf({ assembled }: Judged): UsedStandard[] {
  if (!assembled) return [];
  const { id, name, emittanceNew, emittanceAged, source, confidence } = finish(assembled.finishId);
  const detail = `emittance ${emittanceNew} as new, ${emittanceAged} aged`;
  return [{ id: `std/${id}`, kind: 'finish', name, detail, source, confidence }];
}

function sizeOf({ shape }: Run): UsedStandard[] {
  const size = standardSize(shape);
  if (!size) return [];
  const title = pipeStandardTitle(size.standard);
  return [
    {
      id: size.standard,
      kind: 'pipe',
      name: title,
      detail: 'outside diameters',
      source: size.source,
      confidence: size.confidence,
    },
  ];
}

/** Series whose names are put up: one that a material has and nobody used is not a source. */
const seriesOf = (judged: Judged): UsedStandard[] =>
  materialsUsed(judged).flatMap(({ series }, layer) => {
    const name = judged.used?.names[layer];
    const used = series.flatMap((id) => findSeries(id) ?? []).filter(({ names }) => name && names.includes(name));
    return used.map(({ id, title, source, confidence }): UsedStandard => ({
      id,
      kind: 'made-thickness',
      name: title,
      detail: '',
      source,
      confidence,
    }));
  });

function codeOf(edition: string): UsedStandard[] {
  const code = findCodeEdition(edition);
  if (!code) return [];
  const { id, title, pipes, ducts } = code;
  const row = (key: string, table: { name: string; source: string; confidence: string }): UsedStandard => ({
    id: `${id}/${key}`,
    kind: 'code',
    name: title,
    detail: table.name,
    source: table.source,
    confidence: table.confidence,
  });
  return [row('pipes', pipes), ...(ducts ? [row('ducts', ducts)] : [])];
}

const isJudgedForTouch = ({ used }: Judged) =>
  used?.verdicts.some(({ kind, verdict }) => kind === 'touch' && verdict !== 'does-not-apply') ?? false;

const touchThresholds: UsedStandard = {
  id: 'touch-thresholds',
  kind: 'safety',
  name: 'Burn thresholds by surface and contact',
  detail: 'the touch limit itself is the place’s own, with its source',
  ...touchThresholdsOrigin,
};
