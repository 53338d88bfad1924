import { useMutation } from '@tanstack/react-query';
import { useRef } from 'react';
import { useNavigate } from 'react-router-dom';
import { type ImportKind, LARGEST_FILE, uploadImport } from '../../api/imports';
import { ApiProblem } from '../../api/problem';
import { useTakeImport } from './useImport';

interface UploadedList {
  kind: ImportKind;
  file: File;
}

/** Sends a list and opens its page. */
export function useUpload() {
  const navigate = useNavigate();
  const take = useTakeImport();
  const sending = useRef<AbortController>(null);
  const { error, ...upload } = useMutation({
    mutationFn: ({ kind, file }: UploadedList) => {
      if (file.size > LARGEST_FILE)
        throw new ApiProblem(413, 'import.too-large', 'The file is larger than 100 MB: split it.');
      sending.current = new AbortController();
      return uploadImport(kind, file, sending.current.signal);
    },
    onSuccess: (imported) => {
      take(imported);
      return navigate(`/imports/${imported.id}`);
    },
  });
  const wasCancelled = error instanceof DOMException && error.name === 'AbortError';
  return { ...upload, error: wasCancelled ? null : error, cancel: () => sending.current?.abort() };
}
