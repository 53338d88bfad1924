import { Modal } from 'antd';
import type { Blocker } from 'react-router-dom';

/** The question that a blocked step asks. */
export function LeaveQuestion({ blocker }: { blocker: Blocker }) {
  return (
    <Modal
      open={blocker.state === 'blocked'}
      title="Leave without saving?"
      okText="Leave, lose the changes"
      okButtonProps={{ danger: true }}
      cancelText="Stay here"
      onOk={() => blocker.proceed?.()}
      onCancel={() => blocker.reset?.()}
    >
      The changes on this page aren’t saved yet.
    </Modal>
  );
}
