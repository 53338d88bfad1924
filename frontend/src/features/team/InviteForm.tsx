import type { Role } from '@roothertz/common/access';
import { Button, Form, Input, Select } from 'antd';
import { useState } from 'react';
import { ADDRESS } from '../../components/accountRules';
import { useFormAct } from '../../components/useFormAct';
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
  const [sentTo, setSentTo] = useState<string | null>(null);
  const { mutateAsync: invite } = useInvite();
  const { form, submit, isPending, error } = useFormAct<Invited>(async (invited) => {
    setSentTo(null);
    setSentTo((await invite(invited)).email);
  });
  return (
    <section className={styles.section} aria-label="Invite">
      <h2>Invite a colleague</h2>
      <Form<Invited>
        form={form}
        layout="vertical"
        requiredMark={false}
        noValidate
        className={styles.invite}
        initialValues={{ roles: ['engineer'] }}
        onFinish={(invited) => submit(invited)}
      >
        <Form.Item name="email" label="E-mail" rules={ADDRESS}>
          <Input type="email" autoComplete="off" placeholder="name@company.example" />
        </Form.Item>
        <Form.Item
          name="roles"
          label="Roles"
          rules={[{ required: true, message: 'At least one role is needed' }]}
        >
          <Select<Role[]> mode="multiple" showSearch={false} options={ROLE_OPTIONS} />
        </Form.Item>
        <Button type="primary" htmlType="submit" loading={isPending}>
          Send invitation
        </Button>
      </Form>
      {error && <InviteProblem error={error} />}
      <p role="status" className={styles.hint}>
        {sentTo === null
          ? 'They get an e-mail with a link that is good for 7 days. Every member reads and ranks; roles add to that.'
          : `An invitation is on its way to ${sentTo}.`}
      </p>
    </section>
  );
}
