import type { Role } from '@roothertz/common/access';
import { Button, Form, Input, Select } from 'antd';
import { useState } from 'react';
import { InviteProblem } from './InviteProblem';
import styles from './Team.module.css';
import { ROLE_OPTIONS } from './teamWords';
import { useInvite } from './useTeamActs';

interface Invited {
  email: string;
  roles: Role[];
}

/** Invites a person by e-mail. */
export function InviteForm() {
  const [form] = Form.useForm<Invited>();
  const [sentTo, setSentTo] = useState<string | null>(null);
  const invite = useInvite();
  const send = (invited: Invited) => {
    setSentTo(null);
    invite.mutate(invited, {
      onSuccess: ({ email }) => {
        setSentTo(email);
        form.resetFields();
      },
    });
  };
  return (
    <section className={styles.section} aria-label="Invite">
      <h2>Invite a colleague</h2>
      <Form<Invited>
        form={form}
        layout="vertical"
        requiredMark={false}
        className={styles.invite}
        initialValues={{ roles: ['engineer'] }}
        onFinish={send}
      >
        <Form.Item name="email" label="E-mail" rules={[{ required: true, message: 'An address is needed' }]}>
          <Input type="email" autoComplete="off" placeholder="name@company.example" />
        </Form.Item>
        <Form.Item
          name="roles"
          label="Roles"
          rules={[{ required: true, message: 'At least one role is needed' }]}
        >
          <Select<Role[]> mode="multiple" showSearch={false} options={ROLE_OPTIONS} />
        </Form.Item>
        <Button type="primary" htmlType="submit" loading={invite.isPending}>
          Send invitation
        </Button>
      </Form>
      {invite.error && <InviteProblem error={invite.error} />}
      <p role="status" className={styles.hint}>
        {sentTo === null
          ? 'They get an e-mail with a link that is good for 7 days. Every member reads and ranks; roles add to that.'
          : `An invitation is on its way to ${sentTo}.`}
      </p>
    </section>
  );
}
