import { ApiProperty } from '@nestjs/swagger';
import { Option } from '../../shared/validation/option.decorator.js';
import { IMPORT_KINDS, type ImportKind } from '../import-states.js';

/** What stands beside the file in the form. */
export class UploadImportDto {
  @Option(IMPORT_KINDS)
  kind: ImportKind;
}

/** The whole form, for the documentation. */
export class UploadFormDto extends UploadImportDto {
  @ApiProperty({ type: 'string', format: 'binary', description: 'The list, up to 100 MB and 500 000 rows.' })
  file: unknown;
}
