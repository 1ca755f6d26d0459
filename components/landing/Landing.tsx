import { StateLegend } from "@/components/rack/StateLegend";
import { TowerDrawing } from "@/components/rack/TowerDrawing";
import { ButtonLink } from "@/components/ui/ButtonLink";
import { StateGlyph, type GlyphState } from "@/components/ui/glyphs/StateGlyph";
import { sampleRack } from "./sample-rack";

const JOBS: readonly { state: GlyphState; title: string; text: string }[] = [
  {
    state: "untested",
    title: "What comes next",
    text: "Each unit has its traveler: inspection, continuity, first power, function, together with its neighbours. What can be done now stands first, ranked by how much waits for it. A hold point lets nothing past.",
  },
  {
    state: "passed",
    title: "What was measured",
    text: "A reading is judged as you type it, from the limits, your meter’s accuracy and the project’s rule. Each attempt is kept for good: who, when, with which instrument, and the picture of the scope.",
  },
  {
    state: "failed",
    title: "What it proves",
    text: "4.76 V on a meter that is good to 0.05 V is not proof of 4.75 V. It conforms inside the guard band, and is marked so. What does not conform stays visible until it is repeated or a maintainer accepts it with a reason.",
  },
  {
    state: "reopened",
    title: "What is asked again",
    text: "A maintainer reopens a check with a reason, and what depended on it is in doubt until it holds again. Nothing that was recorded is edited or lost on the way.",
  },
];

/** What the job is, shown with the thing itself. */
export function Landing({ isSignedIn, isOpen }: { isSignedIn: boolean; isOpen: boolean }) {
  return (
    <main
      id="content"
      tabIndex={-1}
      className="mx-auto flex max-w-sheet flex-col gap-12 px-4 pb-16 pt-8 sm:px-6 sm:pt-12"
    >
      <section className="grid items-end gap-x-12 gap-y-5 lg:grid-cols-[minmax(0,1fr)_auto]">
        <div className="max-w-3xl">
          <h1 className="text-3xl sm:text-4xl">The bench log of a machine made of many boards</h1>
          <p className="mt-4 max-w-prose text-lg text-ink-soft">
            A backplane, eight cards, some two hundred checks, months of evenings. Boardwake keeps where every unit
            stands, what was measured with which meter against which limit, what a failure puts in doubt, and what to do
            when you sit down again.
          </p>
        </div>
        <div className="flex flex-wrap gap-2.5">
          {isSignedIn ? (
            <ButtonLink kind="primary" size="lg" href="/projects">
              Your projects
            </ButtonLink>
          ) : (
            <>
              {isOpen && (
                <ButtonLink kind="primary" size="lg" href="/sign-up">
                  Make an account
                </ButtonLink>
              )}
              <ButtonLink kind={isOpen ? "plain" : "primary"} size="lg" href="/sign-in">
                Sign in
              </ButtonLink>
            </>
          )}
        </div>
      </section>

      <figure className="flex flex-col gap-4">
        <TowerDrawing rack={sampleRack} project={undefined} nextSerial="SIN-01" canPlace={false} />
        <StateLegend />
        <figcaption className="max-w-prose px-1 text-sm text-ink-soft">
          An invented machine, half proven. One mark is one check, five stages a card. The sine table fails a check; the
          constituent card has four to repeat; the pen driver waits at a hold point.
        </figcaption>
      </figure>

      <ul className="grid gap-x-10 gap-y-8 sm:grid-cols-2">
        {JOBS.map((job) => (
          <li
            key={job.title}
            className="grid grid-cols-[2.25rem_minmax(0,1fr)] gap-x-3 border-t border-rule-strong pt-4"
          >
            <StateGlyph state={job.state} size={20} className="mt-1" />
            <div>
              <h2 className="text-xl">{job.title}</h2>
              <p className="mt-1.5 max-w-prose text-ink-soft">{job.text}</p>
            </div>
          </li>
        ))}
      </ul>

      <section className="grid gap-x-10 gap-y-6 rounded-lg border border-rule bg-sheet p-5 sm:p-7 lg:grid-cols-3">
        <Place title="At the bench">
          One check a screen, big enough for a phone against the scope. Works in the shed without network and sends what
          was recorded when it is back, in order, once.
        </Place>
        <Place title="At the desk">
          Procedures are written from starters for supply, logic, backplane and mixed-signal boards, issued in versions,
          and moved over to running travelers with the differences shown.
        </Place>
        <Place title="In the post">
          Who follows gets one e-mail a week on the day and hour they chose: what passed, what failed, new pictures,
          what is next. Nobody has to sign in to stop it.
        </Place>
      </section>
    </main>
  );
}

function Place({ title, children }: { title: string; children: string }) {
  return (
    <div>
      <h2 className="text-lg">{title}</h2>
      <p className="mt-1 text-[0.9375rem] text-ink-soft">{children}</p>
    </div>
  );
}
