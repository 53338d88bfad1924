import { Button, Popconfirm } from 'antd';
import type { useImportActs } from './useImportActs';

/** Takes back a list that isn’t applied. */
export function DiscardButton({ discard }: Pick<ReturnType<typeof useImportActs>, 'discard'>) {
  return (
    <Popconfirm
      title="Discard this list?"
      description="Its file and what was said of its columns go. Nothing else changes."
      okText="Discard the list"
      cancelText="Keep it"
      icon={null}
      onConfirm={() => discard.mutate()}
    >
      <Button loading={discard.isPending}>Discard</Button>
    </Popconfirm>
  );
}
