import type { LibraryCode } from '@/api/contracts/library';
import { quantities } from '@/api/contracts/quantities';
import {
  codeColumns,
  ductExemptions,
  type CodeBand,
  type CodeDuctTable,
  type CodeEdition,
  type CodeExemption,
  type DuctUse,
} from '@/api/engine/standards/energy-codes';
import { nameOf } from '@/api/engine/standards/reading';

/** A code edition in SI; what the table prints in °F stays beside it. */
export const toLibraryCode = (edition: CodeEdition): LibraryCode => ({
  id: edition.id,
  title: edition.title,
  pipes: {
    name: edition.pipes.name,
    source: edition.pipes.source,
    confidence: edition.pipes.confidence,
    columns: codeColumns().map(({ title }) => title),
    bands: edition.pipes.bands.map(toBand),
  },
  end: edition.end,
  endSource: edition.endSource,
  endConfidence: edition.endConfidence,
  ducts: edition.ducts && toDucts(edition.ducts),
  footnotes: [...edition.footnotes],
  exemptions: edition.exemptions.map(toExemption),
});

const { temperature, conductivity, resistance } = quantities;
const celsius = (fahrenheit: number) => rounded((fahrenheit - temperature.IP.offset) * temperature.IP.factor);
const rounded = (value: number) => Number(value.toFixed(6));

const toBand = (band: CodeBand): LibraryCode['pipes']['bands'][number] => ({
  printed: band.printed,
  from: band.from === null ? null : celsius(band.from),
  to: band.to === null ? null : celsius(band.to),
  fromIncluded: band.fromIncluded,
  toIncluded: band.toIncluded,
  conductivity: [
    rounded(band.conductivity[0] * conductivity.IP.factor),
    rounded(band.conductivity[1] * conductivity.IP.factor),
  ],
  ratingMean: celsius(band.ratingMean),
  thicknesses: band.thicknesses.map((inches) => (inches > 0 ? nameOf('in', inches) : null)),
});

const uses = ['both', 'heating', 'cooling', 'return'] as const satisfies DuctUse[];

const toDucts = ({ name, locations, values, source, confidence }: CodeDuctTable): LibraryCode['ducts'] => ({
  name,
  locations: [...locations],
  uses: uses.flatMap((use) => {
    const rows = values[use];
    return rows ? [{ use, zones: rows.map(({ zone, R }) => ({ zone, resistances: R.map(toSi) })) }] : [];
  }),
  exemptions: ductExemptions().map(toExemption),
  source,
  confidence,
});
const toSi = (printed: number) => rounded(printed * resistance.IP.factor);

const toExemption = ({ id, what, answer, clause, source, confidence }: CodeExemption) => ({
  id,
  what,
  answer,
  clause,
  source,
  confidence,
});
