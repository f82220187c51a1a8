import { getSession, signOutEverywhere } from '@tipward/contract';
import { useState } from 'react';
import { Button } from '../../../components/ui/button.tsx';
import { ConfirmDialog } from '../../../components/ui/confirm-dialog.tsx';
import { useApiMutation } from '../../../lib/api/api-query.ts';

export function SignOutEverywhere() {
  const [asking, setAsking] = useState(false);
  const leave = useApiMutation(signOutEverywhere, [getSession]);
  return (
    <>
      <p className="m-0 mb-3 max-w-prose">
        Lost a phone, or left a browser open somewhere? This ends every session of yours, this one too.
      </p>
      <Button
        kind="danger"
        onClick={() => {
          setAsking(true);
        }}
      >
        Sign out everywhere
      </Button>
      <ConfirmDialog
        open={asking}
        onOpenChange={setAsking}
        title="Sign out everywhere?"
        confirmLabel="Sign out everywhere"
        kind="danger"
        busy={leave.isPending}
        error={leave.error}
        onConfirm={() => {
          leave.mutate({});
        }}
      >
        Every browser and phone in which you are signed in asks for the password again. Drafts are kept.
      </ConfirmDialog>
    </>
  );
}
