import { useMutation, useQueryClient } from '@tanstack/react-query';
import { Button } from 'antd';
import { useState } from 'react';
import { addSupplier } from '../../api/prices';
import { detailOf } from '../../api/problem';
import { type CellProblem, commasMended, unknownSuppliers } from './draftProblems';
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
  const commas = commasMended(problems);
  return (
    <>
      <span className={styles.problem}>
        {problems.length} {problems.length === 1 ? 'cell has' : 'cells have'} to be mended before saving:{' '}
        {problem.row.part.partNumber}, {problem.message}.
      </span>
      <Button size="small" onClick={show}>
        Show it
      </Button>
      {problem.row.isOverrun && <Overrun draft={draft} problem={problem} />}
      {problem.column === 'part' && !problem.row.isOverrun && (
        <Button size="small" onClick={() => draft.dropRow(problem.row.key)}>
          Give up the changes of this row
        </Button>
      )}
      {commas.length > 0 && (
        <Button size="small" onClick={() => draft.edit(commas)}>
          Read the comma as decimal mark in {commas.length}
        </Button>
      )}
      {draft.draft.refusals.some(({ from }) => from === 'paste') && (
        <Button size="small" onClick={draft.leaveOut}>
          Leave out what has no place
        </Button>
      )}
      {unknownSuppliers(problems).map((name) => (
        <AddSupplier key={name} name={name} />
      ))}
    </>
  );
}

function Overrun({ draft, problem: { row } }: { draft: PriceDraft; problem: CellProblem }) {
  return (
    <>
      <Button size="small" onClick={() => draft.keepMine(row)}>
        Keep mine
      </Button>
      <Button size="small" onClick={() => draft.dropRow(row.key)}>
        Take theirs
      </Button>
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
