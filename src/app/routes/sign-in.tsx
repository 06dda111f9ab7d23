import { Link, Navigate, useSearchParams } from 'react-router';
import { useSession } from '../../features/session/api/get-session.ts';
import { DemoEntry } from '../../features/session/demo-entry.tsx';
import { SignInForm } from '../../features/session/sign-in-form.tsx';
import { Fetched } from '../../ui/fetched.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

/** Only a path on this site: an address elsewhere would let a link lead people away after signing in. */
const safePath = (next: string | null): string => (next !== null && /^\/(?![/\\])/.test(next) ? next : '/jobs');

export function SignInRoute() {
  const session = useSession();
  const [search] = useSearchParams();
  if (session.data?.user) return <Navigate to={safePath(search.get('next'))} replace />;
  return (
    <Sheet
      title="Sign in"
      titleBlock={
        <TitleBlock>
          <TitleCell label="Product" wide>
            Exact layered drawings of both faces of a one-piece MDF face frame
          </TitleCell>
          <TitleCell label="Page" main>
            Sign in
          </TitleCell>
        </TitleBlock>
      }
    >
      <Fetched query={session} what="your session">
        {({ demoAvailable }) => (
          <div className="grid max-w-4xl gap-x-16 gap-y-6 md:grid-cols-2">
            <Section heading="Your account">
              <SignInForm />
              <p className="mt-4">
                <Link to="/forgot-password" className="underline underline-offset-4">
                  Forgot the password
                </Link>
              </p>
              <p className="mt-2">
                No account yet?{' '}
                <Link to="/sign-up" className="underline underline-offset-4">
                  Open a shop
                </Link>
              </p>
            </Section>
            {demoAvailable && (
              <Section heading="Only looking?">
                <DemoEntry />
              </Section>
            )}
          </div>
        )}
      </Fetched>
    </Sheet>
  );
}
