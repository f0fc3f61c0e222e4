import { type CodeBand, codeColumns, type CodeEdition, findCodeEdition } from '../standards/energy-codes';
import type { ThicknessName } from '../standards/thickness-name';
import { type Build, wholeThickness } from './build';
import { bandOf, columnOf, ratedConductivity } from './code-pipe';
import type { Body, LimitVerdict, WorkingInput, WorkingStep } from './study-types';
import type { Trial } from './trial';
import { amount } from './verdict';
import { left } from './working-limits';

/** How the energy code was judged: by the duct's R, by the pipe's name, or by the adjusted thickness. */
export function codeSteps(trial: Trial, verdict: LimitVerdict): WorkingStep[] {
  const edition = findCodeEdition(trial.input.codeEdition);
  if (!edition || verdict.value === null) return [];
  const isDuct = verdict.unit === 'resistance';
  const row = isDuct ? undefined : rowOf(edition, trial);
  return [
    {
      title: edition.title,
      equation: row ? equationOf(row) : 'R = Σ t / k(24 °C), at least the table’s',
      filled: verdict.because,
      result: left(verdict, isDuct ? 'resistance' : 'dimension'),
      inputs: row ? pipeInputs(edition, row, trial) : ductInputs(trial.build),
      source: verdict.source,
    },
  ];
}

type Pipe = Extract<Body, { shape: 'pipe' }>;
/** `rated`: the material's conductivity as compared; null for a bare pipe. */
type Row = { band: CodeBand; pipe: Pipe; rated: number | null };

function rowOf(edition: CodeEdition, { input: { body, states }, build }: Trial): Row | undefined {
  const bands = states.map(({ operating }) => bandOf(edition, operating));
  const band = bands.find((found) => found !== undefined);
  if (!band || body.shape !== 'pipe') return undefined;
  return { band, pipe: body, rated: build.name === null ? null : ratedConductivity(build, band) };
}

function equationOf({ band: { conductivity }, rated }: Row): string {
  const isInRange = rated === null || (rated >= conductivity[0] && rated <= conductivity[1]);
  return isInRange
    ? 'K within the table’s range: nominal thickness at least t'
    : 'T = r [(1 + t/r)^(K/k) − 1], actual thickness at least T';
}

const inTable = 'Btu·in/(h·ft²·°F)';

function pipeInputs(edition: CodeEdition, row: Row, { build }: Trial): WorkingInput[] {
  const { band, pipe } = row;
  const [low, high] = band.conductivity;
  return [
    ...thicknessInput(edition, row),
    ...ratedInput(row, build),
    {
      symbol: 'k',
      meaning: `range of the table; its ${edition.end} end stands in the adjustment`,
      value: [`${low} to ${high} ${inTable}`],
      source: `${edition.endSource} (${edition.endConfidence})`,
    },
    {
      symbol: 'r',
      meaning: 'actual outside radius of the pipe',
      value: [amount('dimension', pipe.outsideDiameter / 2)],
      source: pipe.nominal ?? 'as entered',
    },
    {
      symbol: 'actual',
      meaning: 'actual thickness',
      value: [amount('dimension', wholeThickness(build))],
      source: build.basis === 'made' ? 'made outside diameter' : 'nominal thickness',
    },
  ];
}

function thicknessInput({ pipes }: CodeEdition, { band, pipe }: Row): WorkingInput[] {
  const column = columnOf(pipe);
  const asked = column === null ? undefined : band.thicknesses[column];
  if (column === null || asked === undefined) return [];
  const name: ThicknessName = `in:${asked}`;
  const meaning = `the table’s thickness: fluid ${band.printed} °F, pipe ${codeColumns()[column]?.title ?? ''}`;
  return [{ symbol: 't', meaning, value: [{ thickness: [name] }], source: pipes.name }];
}

function ratedInput({ band, rated }: Row, { materials }: Build): WorkingInput[] {
  if (rated === null) return [];
  const meaning = `conductivity at the rating mean of ${band.ratingMean} °F, rounded as the table prints it`;
  return [
    { symbol: 'K', meaning, value: [`${rated.toFixed(2)} ${inTable}`], source: materials[0]?.curve.source ?? '' },
  ];
}

const ductInputs = (build: Build): WorkingInput[] => [
  {
    symbol: 't',
    meaning: 'thickness as put up',
    value: [amount('dimension', wholeThickness(build))],
    source: build.notes.join(' ') || 'nominal thickness',
  },
];
