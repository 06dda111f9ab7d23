import { Link, Navigate } from 'react-router';
import { useSession } from '../../features/session/api/get-session.ts';
import { SignUpForm } from '../../features/session/sign-up-form.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

export function SignUpRoute() {
  const session = useSession();
  if (session.data?.user) return <Navigate to="/jobs" replace />;
  return (
    <Sheet
      title="Open a shop"
      titleBlock={
        <TitleBlock>
          <TitleCell label="Product" wide>
            Exact layered drawings of both faces of a one-piece MDF face frame
          </TitleCell>
          <TitleCell label="Page" main>
            Open a shop
          </TitleCell>
        </TitleBlock>
      }
    >
      <div className="grid max-w-4xl gap-x-16 gap-y-6 md:grid-cols-2">
        <Section heading="The shop and you">
          <SignUpForm />
          <p className="mt-4">
            Have an account?{' '}
            <Link to="/sign-in" className="underline underline-offset-4">
              Sign in
            </Link>
          </p>
        </Section>
        <Section heading="What it is for">
          <ul className="list-disc space-y-1.5 pl-4">
            <li>Enter a face frame, or upload its frame file, and see both faces of the board at once.</li>
            <li>Know before cutting whether it fits: each finding points at its place.</li>
            <li>Release a revision and download one zip: back and front DXF, setup sheet, checksums.</li>
          </ul>
        </Section>
      </div>
    </Sheet>
  );
}
