import type { RankingRequest } from '@roothertz/common/conditions';
import { App, Button } from 'antd';
import { useState } from 'react';
import type { NamedConditions } from '../../api/conditions';
import { NameForm } from './NameForm';
import styles from './NamedConditionsBar.module.css';
import { NamedMenu, type NamedAction } from './NamedMenu';
import { namedProblem } from './namedProblem';
import { useNamedConditions } from './useNamedConditions';

interface NamedConditionsBarProps {
  namedId: string | null;
  request: RankingRequest;
  /** The part that the member has chosen at these conditions; null where none is. */
  chosenId: string | null;
  /** The part that the page is about: the chosen one, or else the leading one. */
  shownId: string | null;
  /** Whether the member may save conditions. */
  maySave: boolean;
  show: (request: RankingRequest, namedId: string | null) => void;
}

/** The name of the conditions that are shown, whether they are saved, and the menu to change that. */
export function NamedConditionsBar(props: NamedConditionsBarProps) {
  const { namedId, request, chosenId, shownId, maySave, show } = props;
  const named = useNamedConditions(namedId, request, chosenId);
  const [naming, setNaming] = useState<'save-as' | 'rename' | null>(null);
  const { notification } = App.useApp();
  const { current, create, update, remove } = named;
  const tell = (error: unknown) => notification.error({ title: namedProblem(error) });

  const offerUndo = (deleted: NamedConditions) => {
    const key = `deleted-${deleted.id}`;
    const undo = () => {
      notification.destroy(key);
      create.mutate(
        { name: deleted.name, request: deleted, partIds: deleted.partIds },
        { onSuccess: ({ id }) => show(request, id), onError: tell },
      );
    };
    const actions = <Button onClick={undo}>Undo</Button>;
    notification.info({ key, title: `“${deleted.name}” is deleted.`, actions, duration: 12 });
  };
  const partIds = shownId === null ? [] : [shownId];
  const act: Record<NamedAction, () => void> = {
    save: () =>
      current && update.mutate({ named: current, changes: { request, partIds } }, { onError: tell }),
    'save-as': () => setNaming('save-as'),
    rename: () => setNaming('rename'),
    revert: () => current && show(current, current.id),
    delete: () =>
      current &&
      remove.mutate(current, {
        onSuccess: () => {
          show(request, null);
          offerUndo(current);
        },
        onError: tell,
      }),
  };
  const takeName = async (name: string) => {
    if (naming === 'rename' && current) await update.mutateAsync({ named: current, changes: { name } });
    else show(request, (await create.mutateAsync({ name, request, partIds })).id);
    setNaming(null);
  };
  if (naming)
    return (
      <NameForm
        name={naming === 'rename' ? (current?.name ?? '') : ''}
        verb={naming === 'rename' ? 'Rename' : 'Save'}
        onSubmit={takeName}
        onCancel={() => setNaming(null)}
      />
    );
  return (
    <div className={styles.bar}>
      <h2 className={styles.name} title={current?.name}>
        {current?.name ?? 'Conditions without a name'}
      </h2>
      <NamedMenu
        all={named.all}
        currentId={current?.id ?? null}
        state={named.state}
        maySave={maySave}
        onChoose={(chosen) => show(chosen, chosen.id)}
        onAct={(action) => act[action]()}
      />
    </div>
  );
}
