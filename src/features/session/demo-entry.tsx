import { useState } from 'react';
import { role, type Role } from '#shared/contracts/roles.ts';
import { sayError } from '../../lib/say-error.ts';
import { Button } from '../../ui/button.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Select } from '../../ui/select.tsx';
import { useDemoSignIn } from './api/demo-sign-in.ts';

const ROLE_WORDS: Record<Role, string> = {
  owner: 'Owner: everything',
  designer: 'Designer: frames and releases',
  programmer: 'Programmer: file profiles and downloads',
  operator: 'Operator: downloads and setup sheets',
};

/** One button into the demo shop; whose eyes to look through can be chosen, and need not be. */
export function DemoEntry() {
  const [as, setAs] = useState<Role>('owner');
  const demo = useDemoSignIn();
  return (
    <div>
      {demo.isError && (
        <Notice level="stop" word="Not signed in" live>
          {sayError(demo.error)}
        </Notice>
      )}
      <p className="mb-3">An invented shop with a kitchen of frames. No account needed; change what you like.</p>
      <Button wide busy={demo.isPending ? 'Opening the demo shop' : ''} onClick={() => demo.mutate({ role: as })}>
        Open the demo shop
      </Button>
      <div className="mt-3 text-12 text-pencil">
        <Select
          label="as"
          options={role.options.map((value) => ({ value, label: ROLE_WORDS[value] }))}
          value={as}
          onValue={setAs}
        />
      </div>
    </div>
  );
}
