import type { Person, PersonChange } from '#shared/contracts/people.ts';
import { AppError, notFound } from '../../errors.ts';
import type { SignedIn } from '../../http/signed-in.ts';
import type { PeopleStore, PersonRow } from './people.store.ts';

export type PeopleService = ReturnType<typeof peopleService>;

const present = (row: PersonRow): Person => ({
  id: row.id,
  name: row.name,
  email: row.email,
  role: row.role,
  since: row.createdAt.toISOString(),
  lastSignInAt: row.lastSignInAt?.toISOString() ?? null,
  disabled: row.disabled,
  demo: row.demo,
});

/** Who is in a shop, as what, and who has access no more. */
export const peopleService = (store: PeopleStore) => ({
  list: async (shopId: string): Promise<Person[]> => (await store.list(shopId)).map(present),

  /** Throws 'not-found', 'demo-person', 'last-owner' and 'own-role'. */
  async change(who: SignedIn, personId: string, change: PersonChange): Promise<void> {
    const person = await store.find(who.shopId, personId);
    if (!person) throw notFound('person');
    if (person.demo) throw new AppError('demo-person', `${personId} of the demo shop stays as it is`);
    if ('role' in change && personId === who.id && change.role !== person.role)
      throw new AppError('own-role', `${who.id} changes their own role`);
    const { role, disabled } = person;
    if (!(await store.change(who.shopId, personId, { role, disabled, ...change })))
      throw new AppError('last-owner', `${personId} is the last owner of ${who.shopId}`);
  },
});
