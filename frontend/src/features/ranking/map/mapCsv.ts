import type { QuietestMap } from '../../../api/quietestMap';
import { csvText, heading } from '../../../components/charts/plotCsv';

/** The map as CSV: a row for each cell, nothing where no part is fast and stable enough. */
export function mapCsv({ resistances, frequencies, parts, winners }: QuietestMap): string {
  const header = [
    heading('source resistance', 'Ω'),
    heading('frequency', 'Hz'),
    'quietest part',
    'manufacturer',
  ];
  const rows = resistances.flatMap((resistance, column) =>
    frequencies.map((frequency, row) => {
      const part = parts[winners[column][row]];
      return [resistance, frequency, part?.partNumber ?? '', part?.manufacturer ?? ''];
    }),
  );
  return csvText(header, rows);
}
