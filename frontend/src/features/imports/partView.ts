import { partColumns } from '@roothertz/common/imports';
import type { ListedFields } from '@roothertz/common/parts';
import { changeWords } from './changeWords';
import { fieldChoices, partUnits } from './fieldChoices';
import type { ListView } from './listView';

/** How the page shows a list of parts of a kind. */
export function partView(catalogue: ListedFields): ListView {
  return {
    columns: partColumns(catalogue),
    choices: fieldChoices(catalogue),
    usualUnit: (form, field) => {
      if (form === 'origin') return null;
      if (form === 'peak-to-peak') return 'µV';
      return catalogue.parameters.find(({ key }) => key === field)?.displayUnit || null;
    },
    units: (mapped) => partUnits(catalogue, mapped),
    changeWords: (change) => changeWords(catalogue, change),
  };
}
