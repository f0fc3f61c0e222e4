import { show, showWithUnit, unitLabel, type UnitSystem } from '@/api/contracts/quantities';
import { limitWords } from '@/api/contracts/run-words';
import type { Candidate } from '@/api/contracts/study';

import { candidateName, heatKind, marksText } from './candidate-words';
import { shortConditions } from './conditions-text';
import { standingWords, type Standing } from './put-up';
import { curvesOf, type StudiedRun } from './study-facts';

export type TableColumn = { key: string; label: string; unit?: string; numeric?: boolean };
export type StudyTable = { columns: TableColumn[]; rows: { key: string; cells: string[] }[] };

type Told = { runStudy: StudiedRun; standing: Standing; units: UnitSystem };
type Column = TableColumn & { text: (candidate: Candidate, place: number) => string };

/** The strip's numbers as rows and columns: the same for eyes, ears and clipboard. */
export function studyTable(told: Told): StudyTable {
  const columns = columnsOf(told);
  return {
    columns: columns.map(({ text: _text, ...column }) => column),
    rows: told.runStudy.study.candidates.map((candidate, place) => ({
      key: candidate.names.join() || 'bare',
      cells: columns.map(({ text }) => text(candidate, place)),
    })),
  };
}

/** For a spreadsheet: tabs between cells, one line for each thickness. */
export const tableText = ({ columns, rows }: StudyTable): string =>
  [columns.map(({ label, unit }) => (unit ? `${label} (${unit})` : label)), ...rows.map(({ cells }) => cells)]
    .map((line) => line.join('\t'))
    .join('\n');

function columnsOf({ runStudy, standing, units }: Told): Column[] {
  const kind = heatKind(runStudy.study.candidates[0]);
  return [
    { key: 'name', label: 'Thickness', text: (candidate) => candidateName(candidate, units) },
    {
      key: 'outside',
      label: 'Outside diameter',
      unit: unitLabel('dimension', units),
      numeric: true,
      text: ({ outsideDiameter }) => (outsideDiameter === null ? '' : show('dimension', outsideDiameter, { units })),
    },
    ...surfaceColumns(runStudy, units),
    {
      key: 'heat',
      label: 'Heat flow',
      unit: unitLabel(kind, units),
      numeric: true,
      text: ({ heat }) => show(kind, heat.heatFlow ?? heat.flux, { units }),
    },
    { key: 'limits', label: 'Limits', text: (candidate) => marksText(candidate) },
    { key: 'standing', label: 'Which', text: (_candidate, place) => standingWords(standing, place).join(', ') },
  ];
}

/** One for each line of the drawing, under the name of the limit that uses it. */
function surfaceColumns(runStudy: StudiedRun, units: UnitSystem): Column[] {
  return curvesOf(runStudy).map(({ id, values }) => ({
    key: id,
    label: id === 'touch' || id === 'dew-point' ? `Surface for ${limitWords[id]}` : 'Surface',
    unit: unitLabel('temperature', units),
    numeric: true,
    text: (_candidate, place) => {
      const value = values[place];
      return typeof value === 'number' ? show('temperature', value, { units }) : '';
    },
  }));
}

/** What stands under the table: what each surface was judged at, and the limits that are drawn. */
export function tableNotes({ runStudy: { study }, units }: Told): string[] {
  const bare = study.candidates[0];
  if (!bare) return [];
  const judged = bare.verdicts.flatMap(({ kind, judgedAt, limit }) => {
    if (!judgedAt || (kind !== 'touch' && kind !== 'dew-point')) return [];
    const most = limit === null ? '' : `, limit ${showWithUnit('temperature', limit, { units })}`;
    return [`Surface for ${limitWords[kind]}: ${shortConditions(judgedAt, units)}${most}.`];
  });
  return [...judged, `Heat flow: ${shortConditions(bare.heat.judgedAt, units)}.`];
}
