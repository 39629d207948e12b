import { Button, Field, Input, Text } from '@fluentui/react-components';
import { useState } from 'react';
import { type Invitation } from '../api/invite-person';

/** The link of an invitation, to be copied and handed over. */
export function InvitationLink({ invitation }: { invitation: Invitation }) {
  const [state, setState] = useState<'new' | 'copied' | 'refused'>('new');
  const link = new URL(invitation.invitationLink, window.location.origin).href;
  const copy = () =>
    navigator.clipboard.writeText(link).then(
      () => setState('copied'),
      // Browsers keep the clipboard from pages that are not served securely.
      () => setState('refused'),
    );
  return (
    <>
      <Text>
        Hand this link to {invitation.person.name}. It lets one person in, once, and is not shown
        again.
      </Text>
      <Field label="Invitation link">
        <Input
          readOnly
          size="large"
          value={link}
          onFocus={(event) => event.target.select()}
          contentAfter={
            <Button appearance="transparent" onClick={() => void copy()}>
              Copy
            </Button>
          }
        />
      </Field>
      <Text role="status">
        {state === 'copied' && 'The link is copied.'}
        {state === 'refused' && 'This browser does not let us copy. Select the link and copy it.'}
      </Text>
    </>
  );
}
