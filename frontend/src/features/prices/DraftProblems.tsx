import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { useState } from 'react';
import { addSupplier } from '../../api/prices';
import { detailOf } from '../../api/problem';
import { type CellProblem, numbersMended, unknownSuppliers } from './draftProblems';
import { OverrunView } from './OverrunView';
import styles from './SaveBar.module.css';
import type { PriceDraft } from './usePriceDraft';

interface DraftProblemsProps {
  draft: PriceDraft;
  problems: readonly CellProblem[];
  onShow: (problem: CellProblem) => void;
}

/** The cells to be mended, one after the other, and what mends several at once. */
export function DraftProblems({ draft, problems, onShow }: DraftProblemsProps) {
  const [next, setNext] = useState(0);
  const problem = problems[next % problems.length];
  const show = () => {
    onShow(problem);
    setNext((next % problems.length) + 1);
  };
  return (
    <>
      <span className={styles.problem}>
        {problems.length} {problems.length === 1 ? 'cell has' : 'cells have'} to be mended before saving:{' '}
        {problem.row.part.partNumber}, {problem.message}.
      </span>
      <Button size="small" onClick={show}>
        Show it
      </Button>
      {problem.column === 'part' && !problem.row.overrun && (
        <Button size="small" onClick={() => draft.dropRow(problem.row.key)}>
          Give up the changes of this row
        </Button>
      )}
      <MendNumbers draft={draft} problems={problems} />
      {draft.draft.refusals.some(({ from }) => from === 'paste') && (
        <Button size="small" onClick={draft.leaveOut}>
          Leave out what has no place
        </Button>
      )}
      {unknownSuppliers(problems).map((name) => (
        <AddSupplier key={name} name={name} />
      ))}
      {problem.row.overrun && (
        <OverrunView draft={draft} row={problem.row} onSettled={() => onShow(problem)} />
      )}
    </>
  );
}

/** How numbers that can be misread are meant is for the reader to say, for all of them at once. */
function MendNumbers({ draft, problems }: Omit<DraftProblemsProps, 'onShow'>) {
  const commas = numbersMended(problems, ',');
  const groups = numbersMended(problems, '.');
  return (
    <>
      {commas.length > 0 && (
        <Button size="small" onClick={() => draft.edit(commas)}>
          Read the comma as decimal mark in {commas.length}
        </Button>
      )}
      {groups.length > 0 && (
        <Button size="small" onClick={() => draft.edit(groups)}>
          Leave out what groups the digits in {groups.length}
        </Button>
      )}
    </>
  );
}

function AddSupplier({ name }: { name: string }) {
  const queryClient = useQueryClient();
  const add = useMutation({
    mutationFn: () => addSupplier(name),
    onSettled: () => queryClient.invalidateQueries({ queryKey: ['prices', 'suppliers'] }),
  });
  return (
    <>
      <Button size="small" loading={add.isPending} onClick={() => add.mutate()}>
        Add the supplier “{name}”
      </Button>
      {add.error && <span className={styles.problem}>{detailOf(add.error)}</span>}
    </>
  );
}
