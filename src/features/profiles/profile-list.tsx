import { Link } from 'react-router';
import type { StoredProfile } from '#shared/contracts/profiles.ts';
import { Section } from '../../ui/section.tsx';
import { FLAVOUR_WORDS, UNIT_WORDS } from './profile-words.ts';

interface ProfileListProps {
  readonly profiles: readonly StoredProfile[];
  readonly chosenId: string;
  readonly defaultId: string;
}

function Entries({ profiles, chosenId, defaultId }: ProfileListProps) {
  return (
    <ul>
      {profiles.map(({ id, profile }) => (
        <li key={id} className="border-b border-rule">
          <Link
            to={`?profile=${encodeURIComponent(id)}`}
            aria-current={id === chosenId ? 'true' : undefined}
            className="block border-l-4 border-transparent px-2 py-1.5 hover:bg-board-light aria-[current]:border-ink aria-[current]:bg-board-light"
          >
            <span className="block font-bold wrap-anywhere">{profile.name}</span>
            <span className="block text-12 text-pencil">
              {FLAVOUR_WORDS[profile.flavour]}, {UNIT_WORDS[profile.unit].toLowerCase()}
              {id === defaultId && ', used unless another is chosen'}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}

/** The shop's file profiles; each is an address of its own. */
export function ProfileList(props: ProfileListProps) {
  const own = props.profiles.filter(({ builtIn }) => !builtIn);
  return (
    <nav aria-label="File profiles">
      <Section heading="Built in">
        <Entries {...props} profiles={props.profiles.filter(({ builtIn }) => builtIn)} />
      </Section>
      <Section heading="Your own">
        {own.length > 0 ? (
          <Entries {...props} profiles={own} />
        ) : (
          <p className="text-pencil">None yet. Copy one and change the copy.</p>
        )}
      </Section>
    </nav>
  );
}
