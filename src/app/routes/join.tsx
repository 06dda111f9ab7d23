import { useNavigate, useParams } from 'react-router';
import { useJoinOffer } from '../../features/people/api/get-join-offer.ts';
import { JoinForm } from '../../features/people/join-form.tsx';
import { ROLE_WORDS } from '../../features/people/role-words.ts';
import { useSession } from '../../features/session/api/get-session.ts';
import { useEnterSession } from '../../features/session/use-enter-session.ts';
import { isCode } from '../../lib/api-error.ts';
import { ButtonLink } from '../../ui/button-link.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Notice } from '../../ui/notice.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

/** /join/:token, where an invitation leads. */
export function JoinRoute() {
  const { token = '' } = useParams();
  const offer = useJoinOffer(token);
  const session = useSession();
  const enter = useEnterSession();
  const navigate = useNavigate();
  const me = session.data?.user;
  return (
    <Sheet
      title="Join a shop"
      titleBlock={
        <TitleBlock>
          <TitleCell label="Shop" wide>
            {offer.data?.shopName ?? '—'}
          </TitleCell>
          <TitleCell label="Page" main>
            Join
          </TitleCell>
          <TitleCell label="As">{offer.data?.role ?? '—'}</TitleCell>
        </TitleBlock>
      }
    >
      {isCode(offer.error, 'not-found') ? (
        <Empty title="This link opens nothing" actions={<ButtonLink to="/sign-in">Sign in</ButtonLink>}>
          It was used or taken back, or is past its time. Ask the owner of the shop for another one; if you have joined
          already, sign in.
        </Empty>
      ) : (
        <Fetched query={offer} what="the invitation">
          {({ shopName, role, email }) => (
            <div className="max-w-md">
              {me && (
                <Notice level="note">
                  You are signed in as {me.name}. Joining signs you in as the new person instead.
                </Notice>
              )}
              <Section heading="You are invited">
                <p className="mb-4">
                  Into <strong className="font-bold wrap-anywhere">{shopName}</strong>, as {role}: {ROLE_WORDS[role]}.
                </p>
                <JoinForm
                  token={token}
                  email={email}
                  onJoined={(entered) => {
                    enter(entered);
                    void navigate('/jobs', { replace: true });
                  }}
                />
              </Section>
            </div>
          )}
        </Fetched>
      )}
    </Sheet>
  );
}
