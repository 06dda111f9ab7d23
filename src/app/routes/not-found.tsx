import { ButtonLink } from '../../ui/button-link.tsx';
import { Empty } from '../../ui/empty.tsx';
import { Sheet } from '../../ui/sheet.tsx';
import { TitleBlock, TitleCell } from '../../ui/title-block.tsx';

export function NotFoundRoute() {
  return (
    <Sheet
      title="No such page"
      titleBlock={
        <TitleBlock>
          <TitleCell label="Page" main>
            No such page
          </TitleCell>
        </TitleBlock>
      }
    >
      <Empty title="There is nothing at this address" actions={<ButtonLink to="/jobs">To the jobs</ButtonLink>}>
        The address may be mistyped, or the thing was put away. Begin at the list of jobs.
      </Empty>
    </Sheet>
  );
}
