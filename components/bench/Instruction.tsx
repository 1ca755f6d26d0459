/** Part names, pins and test points inside a sentence: U4, TP2, J1, R12, a32, +5V. */
const NAMES =
  /(?<![\w-])((?:TP|U|J|R|C|Q|D|L|RN|SW|F|X|Y|W)\d{1,3}(?:-\d{1,3})?|[abc](?:[1-9]|[12]\d|3[0-2]))(?![\w-])/g;

/** Plain text in paragraphs, as it was written; part and pin names are set in the figures' face. */
export function Instruction({ text }: { text: string }) {
  return (
    <div className="grid max-w-prose gap-2 text-xl leading-normal">
      {text.split(/\n{2,}/).map((paragraph, index) => (
        <p key={index} className="whitespace-pre-line">
          {paragraph.split(NAMES).map((part, at) =>
            at % 2 === 1 ? (
              <span key={at} className="mono font-medium">
                {part}
              </span>
            ) : (
              part
            ),
          )}
        </p>
      ))}
    </div>
  );
}
