import { Link } from 'react-router';
import { ForgotPasswordForm } from '../../features/session/forgot-password-form.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

/** /forgot-password */
export function ForgotPasswordRoute() {
  return (
    <Sheet
      title="Forgot the password"
      titleBlock={
        <TitleBlock>
          <TitleCell label="Page" main>
            Forgot the password
          </TitleCell>
        </TitleBlock>
      }
    >
      <div className="grid max-w-4xl gap-x-16 gap-y-6 md:grid-cols-2">
        <Section heading="A link by mail">
          <ForgotPasswordForm />
          <p className="mt-4">
            <Link to="/sign-in" className="underline underline-offset-4">
              Back to signing in
            </Link>
          </p>
        </Section>
        <Section heading="When no mail comes">
          <ul className="list-disc space-y-1.5 pl-4">
            <li>Look among the unwanted mail, and whether the address is the one that you sign in with.</li>
            <li>
              A server that sends no mail keeps it in the shop’s outbox: ask the owner of the shop for the link in it.
            </li>
          </ul>
        </Section>
      </div>
    </Sheet>
  );
}
