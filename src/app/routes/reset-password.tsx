import { useParams } from 'react-router';
import { ResetPasswordForm } from '../../features/session/reset-password-form.tsx';
import { Section } from '../../ui/section.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

/** /reset-password/:token, where the mailed link leads. */
export function ResetPasswordRoute() {
  const { token = '' } = useParams();
  return (
    <Sheet
      title="Set a new password"
      titleBlock={
        <TitleBlock>
          <TitleCell label="Page" main>
            New password
          </TitleCell>
        </TitleBlock>
      }
    >
      <div className="max-w-md">
        <Section heading="By the mailed link">
          <ResetPasswordForm token={token} />
        </Section>
      </div>
    </Sheet>
  );
}
