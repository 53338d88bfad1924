import {
  headingReader,
  type ListedFields,
  type ParameterDefinition,
  type PartColumn,
} from '../parts/index.js';
import { parseUnit } from '../units/index.js';
import { type ColumnMapping, NOISE_FORMS } from './columnMapping.js';
import { type HeadingPieces, readHeading } from './readHeading.js';

/** What a heading says that its column is, but for the column's place. */
export type ProposedColumn = Omit<ColumnMapping, 'column'> & {
  /** The heading names no unit: that of the catalogue is assumed. */
  unitAssumed: boolean;
};

const NOTHING = { unit: null, frequency: null, quantity: null, origin: null, unitAssumed: false };
const SLOW_NOISE = 'voltageNoise';

/**
 * Says of one heading after the other what the column is, or null where its words mean nothing of the kind
 * of part: a label, key or synonym of the catalogue, as it stands or with unit, frequency and “typ” around it.
 */
export function columnProposer(catalogue: ListedFields): (heading: string) => ProposedColumn | null {
  const read = headingReader(catalogue);
  return (heading) => {
    const pieces = readHeading(heading);
    const whole = read(heading);
    const asWhole = whole && proposal(catalogue, whole, { ...pieces, ...plainly(whole, pieces) });
    if (whole !== null && hasPlainUnit(whole)) return asWhole;
    const named = read(pieces.wholeName);
    if (named !== null && hasPlainUnit(named)) return proposal(catalogue, named, { ...pieces, origin: null });
    const stripped = read(pieces.name) ?? slowNoise(catalogue, pieces);
    return stripped === null ? asWhole : proposal(catalogue, stripped, pieces);
  };
}

/** What a column that was recognised by another name is: its unit and frequency are read from the heading. */
export function proposeField(catalogue: ListedFields, field: string, heading: string): ProposedColumn {
  const isFigure = catalogue.parameters.some(({ key }) => key === field);
  const column: PartColumn = isFigure
    ? { holds: 'figure', key: field, unit: '' }
    : { holds: 'text', key: field };
  return proposal(catalogue, column, readHeading(heading));
}

function hasPlainUnit(column: PartColumn): boolean {
  return column.holds !== 'figure' || parseUnit(column.unit) !== null;
}

/** A heading that is a name as a whole has no “max” or frequency of its own: “supply voltage max”. */
function plainly(column: PartColumn, pieces: HeadingPieces): Partial<HeadingPieces> {
  const unit = column.holds === 'figure' && column.unit !== '' ? pieces.unit : null;
  return { unit, frequency: null, peakToPeak: false, origin: null };
}

/** “0.1–10 Hz noise” and “noise p-p” name no parameter, but mean the voltage noise. */
function slowNoise({ parameters }: ListedFields, { name, peakToPeak }: HeadingPieces): PartColumn | null {
  const known = parameters.some(({ key }) => key === SLOW_NOISE);
  const speaks =
    /^(?:input|low.?frequency|lf|1\/f|voltage|niederfrequent\S*)?\s*(?:voltage\s*)?(?:noise|rauschen|bruit)$/i;
  return known && peakToPeak && speaks.test(name) ? { holds: 'figure', key: SLOW_NOISE, unit: '' } : null;
}

function proposal({ parameters }: ListedFields, column: PartColumn, pieces: HeadingPieces): ProposedColumn {
  if (column.holds === 'text') return { ...NOTHING, field: column.key, form: 'value' };
  if (column.holds === 'origin') return { ...NOTHING, field: column.key, form: 'origin' };
  return figureProposal(
    parameters.find(({ key }) => key === column.key)!,
    pieces,
  );
}

function figureProposal(parameter: ParameterDefinition, pieces: HeadingPieces): ProposedColumn {
  const forms = NOISE_FORMS[parameter.key];
  const isSpot = forms !== undefined && pieces.frequency !== null;
  const isPeaks = forms?.peakToPeak === true && pieces.peakToPeak;
  const form = isPeaks ? 'peak-to-peak' : isSpot ? 'spot' : 'value';
  const kind = isPeaks ? 'voltage' : parameter.kind;
  const unit = pieces.unit !== null && parseUnit(pieces.unit, kind)?.kind === kind ? pieces.unit : null;
  return {
    field: parameter.key,
    form,
    unit: unit ?? (isPeaks ? 'µV' : parameter.displayUnit),
    frequency: form === 'spot' ? pieces.frequency : null,
    quantity: null,
    origin: pieces.origin === 'maximum' ? 'maximum' : null,
    unitAssumed: unit === null && (isPeaks || parameter.displayUnit !== ''),
  };
}
