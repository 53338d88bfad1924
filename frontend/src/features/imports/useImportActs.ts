import { useMutation } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { applyImport, cancelImport, discardImport, undoImport } from '../../api/imports';
import { useTakeImport } from './useImport';

/** What can be done with an import as a whole. */
export function useImportActs(id: string) {
  const onSuccess = useTakeImport();
  const apply = useMutation({ mutationFn: () => applyImport(id), onSuccess });
  const cancel = useMutation({ mutationFn: () => cancelImport(id), onSuccess });
  const undo = useMutation({ mutationFn: () => undoImport(id), onSuccess });
  const navigate = useNavigate();
  const discard = useMutation({ mutationFn: () => discardImport(id), onSuccess: () => navigate('/imports') });
  return { apply, cancel, undo, discard };
}
