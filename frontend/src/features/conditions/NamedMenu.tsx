import { Button, Dropdown, type MenuProps } from 'antd';
import type { NamedConditions } from '../../api/conditions';
import styles from './NamedConditionsBar.module.css';
import type { NamedState } from './useNamedConditions';

export type NamedAction = 'save' | 'save-as' | 'rename' | 'revert' | 'delete';

interface NamedMenuProps {
  all: readonly NamedConditions[];
  currentId: string | null;
  state: NamedState;
  maySave: boolean;
  onChoose: (chosen: NamedConditions) => void;
  onAct: (action: NamedAction) => void;
}

const STATE_LABELS: Record<NamedState, string> = {
  unnamed: 'not saved',
  saved: 'saved',
  changed: 'changed',
};

const CHOOSE = 'choose:';

/** The state of the named conditions; its menu holds the team's others and what can be done. */
export function NamedMenu({ all, currentId, state, maySave, onChoose, onAct }: NamedMenuProps) {
  const onClick: MenuProps['onClick'] = ({ key }) => {
    if (!key.startsWith(CHOOSE)) return onAct(key as NamedAction);
    const chosen = all.find(({ id }) => key === CHOOSE + id);
    if (chosen) onChoose(chosen);
  };
  const items = [chooseGroup(all), ...actionItems(state, maySave)];
  return (
    <Dropdown
      trigger={['click']}
      autoFocus
      menu={{ items, onClick, selectedKeys: currentId ? [CHOOSE + currentId] : [], className: styles.menu }}
    >
      <Button
        type="text"
        size="small"
        id="named-conditions"
        aria-label={`${STATE_LABELS[state]}: named conditions`}
      >
        {STATE_LABELS[state]} ▾
      </Button>
    </Dropdown>
  );
}

type Item = NonNullable<MenuProps['items']>[number];

function chooseGroup(all: readonly NamedConditions[]): Item {
  const children = all.map(({ id, name }) => ({ key: CHOOSE + id, label: name }));
  const none = { key: 'none', label: 'The team has none yet', disabled: true };
  return { type: 'group', label: 'Named conditions', children: children.length > 0 ? children : [none] };
}

function actionItems(state: NamedState, maySave: boolean): Item[] {
  const revert = { key: 'revert', label: 'Back to what is saved', disabled: state !== 'changed' };
  if (!maySave) return [{ type: 'divider' }, revert];
  return [
    { type: 'divider' },
    { key: 'save', label: 'Save the changes', disabled: state !== 'changed' },
    { key: 'save-as', label: 'Save as…' },
    revert,
    { key: 'rename', label: 'Rename…', disabled: state === 'unnamed' },
    { key: 'delete', label: 'Delete', danger: true, disabled: state === 'unnamed' },
  ];
}
