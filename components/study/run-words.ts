import { showWithUnit, type UnitSystem } from '@/api/contracts/quantities';
import { kindText, lengthOf } from '@/api/contracts/run-words';
import type { RunStudy } from '@/api/contracts/study';
import { thicknessText } from '@/api/contracts/words-text';
import { shortName } from '@/components/build-up/covering-words';
import { rowSize, type RunRow } from '@/components/run/run-row';

/** "DN 100 steel, service tunnel"; what was given a name goes by it. */
export function runTitle(row: RunRow, units: UnitSystem): string {
  const { run, place } = row;
  const what = run.title || `${rowSize(row, units)} ${kindText(run.shape)}`;
  return [what, ...(place ? [place.name] : [])].join(', ');
}

/** "R30 · Steam, 7 bar gauge · drawing M-401 · 86.0 m". */
export function runOver({ run, service, drawing }: RunRow, units: UnitSystem): string {
  const length = lengthOf(run.shape);
  return [
    run.number,
    service?.name ?? '',
    drawing ? `drawing ${drawing.number}` : '',
    length === null ? '' : showWithUnit('length', length, { units }),
    run.hold ? `on hold: ${run.hold.reason}` : '',
  ]
    .filter(Boolean)
    .join(' · ');
}

/** Hot or cold as the service is, or as the run's own state says. */
export const natureOf = ({ run, judged, service }: RunRow): 'hot' | 'cold' =>
  run.override?.state?.nature ?? judged?.nature ?? service?.states[0]?.nature ?? 'hot';

/** "38 mm mineral fibre pipe insulation under Aluminium sheet jacket, chosen": what goes up, and who says so. */
export function assemblyText({ assembly }: RunStudy, units: UnitSystem): string {
  const layers = assembly.layers.map(({ materialName, thickness }) =>
    thickness === null
      ? shortName(materialName)
      : `${thicknessText([thickness], units)} ${lowerFirst(shortName(materialName))}`,
  );
  const { source, specificationLabel } = assembly;
  const who = source === 'specified' && specificationLabel ? `specified (${specificationLabel})` : source;
  return `${layers.join(' + ')}, ${lowerFirst(assembly.finishName)}: ${who}`;
}

const lowerFirst = (text: string) =>
  /^[A-Z]{2}|^[A-Z]-/.test(text) ? text : text.charAt(0).toLowerCase() + text.slice(1);
