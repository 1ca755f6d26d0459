/** A piece of a sentence; with an address it is a link. */
export type SentencePart = { text: string; href?: string };

/** What a sentence needs besides the payload: names and addresses as they are now. */
export type SentenceContext = {
  /** Slug of the project. */
  project: string;
  actor: string;
  /** Serial of the unit today; the payload has the one of the time. Null when the unit is gone. */
  unitSerial: string | null;
  checkId: string | null;
  checkTitle: string | null;
  subjectId: string | null;
};

export type Phrases = ReturnType<typeof phrases>;

/** The things a sentence names, each with the address it has in the workshop. */
export function phrases(context: SentenceContext) {
  const home = `/projects/${encodeURIComponent(context.project)}`;
  const unitHref = context.unitSerial === null ? undefined : `${home}/units/${encodeURIComponent(context.unitSerial)}`;
  const checkHref =
    unitHref && context.checkId ? `${unitHref}?check=${context.checkId}#check-${context.checkId}` : undefined;
  const link = (text: string, href: string | undefined): SentencePart => (href ? { text, href } : { text });
  const unit = (serial: string) => link(serial, unitHref);
  const check = (title: string) => link(`“${title}”`, checkHref);
  return {
    who: context.actor,
    project: (text: string) => link(text, `${home}/settings`),
    people: (text: string) => link(text, `${home}/people`),
    order: (text: string) => link(text, `${home}/order/boards`),
    slots: (text: string) => link(text, `${home}/boards`),
    board: (code: string, name?: string) =>
      link(name ? `${code} ${name}` : code, `${home}/boards/${encodeURIComponent(code)}`),
    procedure: (code: string, number: number) =>
      link(
        `version ${number} of the procedure of ${code}`,
        `${home}/boards/${encodeURIComponent(code)}/procedure/${number}`,
      ),
    pinMap: (code: string, reference: string) =>
      link(`${code} ${reference}`, `${home}/wiring?connector=${encodeURIComponent(`${code}.${reference}`)}`),
    wiring: (text: string, path = "") => link(text, `${home}/wiring${path}`),
    parts: (text: string, path = "") => link(text, `${home}/parts${path}`),
    block: (name: string) => link(name, context.subjectId ? `${home}/parts/blocks/${context.subjectId}` : undefined),
    unit,
    check,
    fault: (number: number, title: string) => link(`F${number} ${title}`, `${home}/faults/${number}`),
    rework: (number: number) => link(`rework R${number}`, unitHref && `${unitHref}/reworks#R${number}`),
    punchList: (code: string, letter: string) =>
      link(`punch list of ${code} rev ${letter}`, `${home}/boards/${encodeURIComponent(code)}#punch-${letter}`),
    netlists: (text: string, code: string) => link(text, `${home}/boards/${encodeURIComponent(code)}/netlists`),
    probing: (text: string) =>
      link(text, unitHref && context.subjectId ? `${unitHref}/probing/${context.subjectId}` : undefined),
    entry: (title: string) => link(`“${title}”`, context.subjectId ? `${home}/log/${context.subjectId}` : undefined),
    file: (text: string) => link(text, context.subjectId ? `/api${home}/files/${context.subjectId}` : undefined),
    /** Where a file belongs, when it belongs anywhere. */
    place: (word: string): (string | SentencePart)[] => {
      if (context.checkTitle !== null && context.unitSerial !== null)
        return [word, check(context.checkTitle), " on ", unit(context.unitSerial)];
      return context.unitSerial === null ? [] : [word, unit(context.unitSerial)];
    },
  };
}
