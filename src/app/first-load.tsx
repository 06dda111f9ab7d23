/** Before the first page's own file is there: an empty sheet. */
export const FirstLoad = () => (
  <div className="min-h-dvh bg-desk p-2">
    <div className="min-h-[calc(100dvh-1rem)] border border-ink bg-paper p-1">
      <p role="status" className="border border-ink px-4 py-3 text-pencil">
        Stilepost: opening the page.
      </p>
    </div>
  </div>
);
