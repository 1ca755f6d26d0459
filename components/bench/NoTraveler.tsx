import Link from "next/link";

/** A unit whose board has no issued procedure yet. */
export function NoTraveler({ project, serial }: { project: string; serial: string }) {
  return (
    <main className="mx-auto grid max-w-prose gap-3 p-6 text-lg">
      <h1 className="text-2xl">{serial} has no traveler yet</h1>
      <p>A maintainer writes and issues a procedure for its board. Then its checks appear here.</p>
      <Link className="link" href={`/projects/${project}/units/${encodeURIComponent(serial)}`}>
        To the unit
      </Link>
    </main>
  );
}
