/** In place of a check: there is none, or this page cannot show it. */
export function NothingHere({ known, unitHref }: { known: boolean; unitHref: string }) {
  return (
    <main className="mx-auto grid max-w-prose gap-3 p-6 text-lg">
      <p>
        {known
          ? "This page is older than the check: it does not know this kind. Reload it when there is a network."
          : "This unit has no traveler yet. A maintainer issues a procedure for its board, and its checks appear here."}
      </p>
      <a className="link" href={unitHref}>
        To the unit
      </a>
    </main>
  );
}
