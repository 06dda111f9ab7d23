import type { Person } from '#shared/contracts/people.ts';
import { Button } from '../../ui/button.tsx';
import { Table, type Column } from '../../ui/table.tsx';
import { When } from '../../ui/when.tsx';

interface PeopleTableProps {
  readonly people: readonly Person[];
  /** Of the person who looks: nobody changes themselves. */
  readonly myId: string;
  readonly onRole: (person: Person) => void;
  readonly onTake: (person: Person) => void;
  readonly onGiveBack: (person: Person) => void;
}

const Moment = ({ iso }: { readonly iso: string }) => (
  <span className="whitespace-nowrap">
    <When iso={iso} />
  </span>
);

/** Everybody who is or was in the shop. */
export function PeopleTable({ people, myId, onRole, onTake, onGiveBack }: PeopleTableProps) {
  const acts = (person: Person) => {
    if (person.id === myId) return <span className="text-12 text-pencil">you</span>;
    if (person.demo) return <span className="text-12 text-pencil">of the demo</span>;
    if (person.disabled) {
      return (
        <Button kind="quiet" aria-label={`Give access back to ${person.name}`} onClick={() => onGiveBack(person)}>
          Give access back
        </Button>
      );
    }
    return (
      <span className="inline-flex flex-wrap justify-end gap-x-4">
        <Button kind="quiet" aria-label={`Change the role of ${person.name}`} onClick={() => onRole(person)}>
          Change role
        </Button>
        <Button kind="quiet" aria-label={`Take away the access of ${person.name}`} onClick={() => onTake(person)}>
          Take away access
        </Button>
      </span>
    );
  };
  const columns: readonly Column<Person>[] = [
    {
      key: 'name',
      head: 'Name',
      names: true,
      cell: ({ name }) => <span className="font-bold wrap-anywhere">{name}</span>,
      sortBy: ({ name }) => name,
    },
    {
      key: 'email',
      head: 'E-mail',
      cell: ({ email }) => <span className="wrap-anywhere">{email}</span>,
      sortBy: ({ email }) => email,
    },
    {
      key: 'role',
      head: 'Role',
      cell: ({ role, disabled }) => (disabled ? <span className="text-pencil">{role}, no access</span> : role),
      sortBy: ({ role }) => role,
    },
    {
      key: 'since',
      head: 'Since',
      cell: ({ since }) => <Moment iso={since} />,
      sortBy: ({ since }) => since,
      spare: true,
    },
    {
      key: 'last',
      head: 'Last signed in',
      cell: ({ lastSignInAt }) => (lastSignInAt === null ? 'never' : <Moment iso={lastSignInAt} />),
      sortBy: ({ lastSignInAt }) => lastSignInAt ?? '',
    },
    { key: 'acts', head: 'What to do', hideHead: true, align: 'right', cell: acts },
  ];
  return <Table caption="People of the shop" columns={columns} rows={people} rowKey={({ id }) => id} />;
}
