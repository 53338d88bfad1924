import { DECIMAL_MARKS, type DecimalMark } from '@roothertz/common/imports';
import { Option } from '../../shared/validation/option.decorator.js';
import { type Delimiter, DELIMITERS } from '../../shared/csv/csv-format.js';

/** How an exported list is to be written. */
export class ExportQueryDto {
  @Option(DELIMITERS, { optional: true })
  delimiter: Delimiter = 'comma';

  @Option(DECIMAL_MARKS, { optional: true })
  decimalMark: DecimalMark = 'point';
}
