import { App, Button } from 'antd';

const SECONDS_TO_UNDO = 12;

interface UndoNotice {
  /** Tells this act from others. */
  key: string;
  /** What was done. */
  title: string;
  /** Takes it back; what it answers is said. */
  undo: () => Promise<string | void>;
  /** Why it can't be taken back, in words. */
  refused: (error: unknown) => string;
}

/** Says what was done and offers for a while to take it back. */
export function useUndoNotice(): (notice: UndoNotice) => void {
  const { notification } = App.useApp();
  return ({ key, title, undo, refused }) => {
    const takeBack = async () => {
      notification.destroy(key);
      try {
        const said = await undo();
        if (said) notification.info({ title: said, placement: 'bottomRight' });
      } catch (error) {
        notification.error({ title: 'This can’t be taken back', description: refused(error) });
      }
    };
    notification.open({
      key,
      title,
      duration: SECONDS_TO_UNDO,
      placement: 'bottomRight',
      actions: <Button onClick={() => void takeBack()}>Undo</Button>,
    });
  };
}
