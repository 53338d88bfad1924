import { useMutation } from '@tanstack/react-query';
import { applyImport, cancelImport, undoImport } from '../../api/imports';
import { useTakeImport } from './useImport';

/** What can be done with an import as a whole. */
export function useImportActs(id: string) {
  const onSuccess = useTakeImport();
  const apply = useMutation({ mutationFn: () => applyImport(id), onSuccess });
  const cancel = useMutation({ mutationFn: () => cancelImport(id), onSuccess });
  const undo = useMutation({ mutationFn: () => undoImport(id), onSuccess });
  return { apply, cancel, undo };
}
