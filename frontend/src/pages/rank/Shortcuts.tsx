import { Modal } from 'antd';
import { useEffect, useState } from 'react';
import styles from './RankPage.module.css';
import { LOCAL_KEYS, readKey, SHORTCUTS } from './shortcutKeys';

const ASK = 'roothertz:shortcuts';

/** Listens for the page's shortcuts and lists them on “?”. */
export function Shortcuts() {
  const [open, setOpen] = useState(false);
  useEffect(() => {
    let pending: string | null = null;
    const onKeyDown = (event: KeyboardEvent) => {
      if (isTaken(event)) return;
      if (event.key === '?') return setOpen(true);
      const read = readKey(pending, event.key);
      pending = read.pending;
      if (!read.shortcut) return;
      event.preventDefault();
      document.querySelector<HTMLElement>(read.shortcut.target)?.focus();
    };
    const ask = () => setOpen(true);
    document.addEventListener('keydown', onKeyDown);
    document.addEventListener(ASK, ask);
    return () => {
      document.removeEventListener('keydown', onKeyDown);
      document.removeEventListener(ASK, ask);
    };
  }, []);
  return (
    <Modal title="Keyboard" open={open} footer={null} onCancel={() => setOpen(false)}>
      <dl className={styles.keys}>
        {[...SHORTCUTS, ...LOCAL_KEYS].map(({ keys, label }) => (
          <div key={keys}>
            <dt>
              <kbd>{keys}</kbd>
            </dt>
            <dd>{label}</dd>
          </div>
        ))}
      </dl>
    </Modal>
  );
}

export function ShortcutsButton() {
  return (
    <button
      type="button"
      className={styles.linkButton}
      onClick={() => document.dispatchEvent(new CustomEvent(ASK))}
    >
      Keyboard: ?
    </button>
  );
}

function isTaken(event: KeyboardEvent): boolean {
  if (event.defaultPrevented || event.ctrlKey || event.metaKey || event.altKey) return true;
  const { target } = event;
  return (
    target instanceof Element &&
    target.closest('input, textarea, select, [role="dialog"], [role="menu"]') !== null
  );
}
