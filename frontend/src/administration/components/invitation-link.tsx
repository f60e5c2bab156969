import type { AnswerOf, contract } from '@bellgap/common/api';
import { App, Button, Input, Space } from 'antd';
import { Moment } from '../../ui/moment';

/** A link that is shown this once: only its hash is kept. */
export function InvitationLink({ invitation }: { invitation: AnswerOf<typeof contract.createUser> }) {
  const { message } = App.useApp();
  const { user, link, expiresAt } = invitation;
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(link);
      message.success('The link is copied');
    } catch {
      message.error('This browser did not allow the copy; select the link and copy it by hand.');
    }
  };
  return (
    <>
      <p>
        Give this link to {user.name}. It is shown once, works once, and holds until <Moment at={expiresAt} />.
      </p>
      <Space.Compact block style={{ margin: '14px 0' }}>
        <Input
          readOnly
          value={link}
          className="num"
          aria-label="Invitation link"
          onFocus={({ target }) => target.select()}
        />
        <Button type="primary" onClick={() => void copy()}>
          Copy
        </Button>
      </Space.Compact>
      <p className="soft">A new link makes this one void. Roles are granted apart, by opening the person.</p>
    </>
  );
}
