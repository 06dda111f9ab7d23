import { isRouteErrorResponse, useRouteError } from 'react-router';
import { sayError } from '../lib/say-error.ts';
import { Button } from '../ui/button.tsx';
import { ButtonLink } from '../ui/button-link.tsx';
import { Notice } from '../ui/notice.tsx';
import { Sheet } from '../ui/sheet.tsx';

function say(error: unknown): string {
  if (isRouteErrorResponse(error)) return `${error.status} ${error.statusText}`;
  // Browsers word it differently; a page file that is gone means that the product was updated meanwhile.
  if (error instanceof TypeError && /import|module/i.test(error.message))
    return 'A part of this page could not be fetched. Reload the page.';
  return sayError(error);
}

/** For faults that no page foresaw: says what is known, and how to go on. */
export function ErrorPage() {
  const error = useRouteError();
  const technical = error instanceof Error ? error.message : '';
  return (
    <Sheet title="This page failed">
      <div className="max-w-2xl">
        <Notice level="stop" word="Failed" live>
          {say(error)}
        </Notice>
        <p className="mb-4">What was saved is safe. Reload the page; when it fails again, report what stands below.</p>
        <div className="mb-4 flex flex-wrap gap-3">
          <Button kind="main" onClick={() => window.location.reload()}>
            Reload the page
          </Button>
          <ButtonLink to="/jobs">To the jobs</ButtonLink>
        </div>
        {technical !== '' && (
          <pre className="border border-rule p-3 text-12 whitespace-pre-wrap wrap-anywhere">{technical}</pre>
        )}
      </div>
    </Sheet>
  );
}
