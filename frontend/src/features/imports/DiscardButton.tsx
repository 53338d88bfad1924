import { Button } from 'antd';
import { AskFirst } from '../../components/AskFirst';
import type { useImportActs } from './useImportActs';

/** Takes back a list that isn’t applied. */
export function DiscardButton({ discard }: Pick<ReturnType<typeof useImportActs>, 'discard'>) {
  return (
    <AskFirst
      question="Discard this list?"
      outcome="Its file and what was said of its columns go. Nothing else changes."
      verb="Discard the list"
      refusal="Keep it"
      onAgree={() => discard.mutate()}
    >
      <Button loading={discard.isPending}>Discard</Button>
    </AskFirst>
  );
}
