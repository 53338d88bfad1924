import {
  COLUMN_FORMS,
  type ColumnForm,
  type ColumnMapping,
  DECIMAL_MARKS,
  type DecimalMark,
} from '@roothertz/common/imports';
import { type Origin, ORIGINS, type QuantityField } from '@roothertz/common/parts';
import { currencyError, OFFER_FIELDS, SUPPLIER_NAME } from '@roothertz/common/prices';
import { Checked } from '../../shared/validation/checked.decorator.js';
import { Nested, NestedList } from '../../shared/validation/nested.decorator.js';
import { Option } from '../../shared/validation/option.decorator.js';
import { Quantity } from '../../shared/validation/quantity.decorator.js';
import { StoredText } from '../../shared/validation/stored-text.decorator.js';
import { Text } from '../../shared/validation/text.decorator.js';
import { Version } from '../../shared/validation/version.decorator.js';
import { type Delimiter, DELIMITERS, type Encoding, ENCODINGS } from '../../shared/csv/csv-format.js';
import { MOST_COLUMNS } from '../file/import-columns.js';

const MOST_LINES = 1_000_000;

const COLUMN: QuantityField = {
  label: 'column',
  kind: 'count',
  bounds: { from: 0, to: MOST_COLUMNS - 1 },
  integer: true,
  help: 'The column’s place, from 0.',
};
const FREQUENCY: QuantityField = {
  label: 'frequency',
  kind: 'frequency',
  bounds: { above: 0, to: 1e9 },
  help: 'At which the noise density is stated.',
};
const HEADER_LINE: QuantityField = {
  label: 'header line',
  kind: 'count',
  bounds: { from: 1, to: MOST_LINES },
  integer: true,
  help: 'The line on which the headings stand, from 1.',
};
const MAYBE = { optional: true, nullable: true };

export class ColumnMappingDto implements ColumnMapping {
  @Quantity(COLUMN)
  column: number;

  @Text({ label: 'field', minLength: 1, maxLength: 60, description: 'Key of a field or parameter.' })
  field: string;

  @Option(COLUMN_FORMS, { optional: true })
  form: ColumnForm = 'value';

  @Text({
    label: 'unit',
    maxLength: 40,
    ...MAYBE,
    description: 'Of figures whose cells state none; of prices, their currency.',
  })
  unit: string | null = null;

  @Quantity(FREQUENCY, MAYBE)
  frequency: number | null = null;

  @Quantity(OFFER_FIELDS.minimumQuantity, MAYBE)
  quantity: number | null = null;

  @Option(ORIGINS, MAYBE)
  origin: Origin | null = null;
}

/** What holds for all rows of a price list that has no column for it; what is left out isn't stated. */
export class WholeListDto {
  @StoredText(SUPPLIER_NAME, { optional: true })
  supplier?: string;

  @Checked(currencyError, { description: 'ISO 4217' }, { optional: true })
  currency?: string;
}

/** What the columns are, and what is overruled of the dialect; without columns they are proposed anew. */
export class MapImportDto {
  @Option(ENCODINGS, { optional: true })
  encoding?: Encoding;

  @Option(DELIMITERS, { optional: true })
  delimiter?: Delimiter;

  @Option(DECIMAL_MARKS, { optional: true })
  decimalMark?: DecimalMark;

  @Quantity(HEADER_LINE, { optional: true })
  headerLine?: number;

  @Nested(() => WholeListDto, { optional: true })
  wholeList?: WholeListDto;

  /** Left out = whatever the import's version is. */
  @Version({ optional: true })
  version?: number;

  @NestedList(() => ColumnMappingDto, { most: MOST_COLUMNS, optional: true })
  columns?: ColumnMappingDto[];
}
