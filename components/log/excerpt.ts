/** The beginning of a text, cut between paragraphs, or between words when the first one is long already. */
export function excerpt(markdown: string, most = 700): { text: string; isWhole: boolean } {
  if (markdown.length <= most) return { text: markdown, isWhole: true };
  const head = markdown.slice(0, most);
  const paragraph = head.lastIndexOf("\n\n");
  if (paragraph > most / 3) return { text: closeFence(head.slice(0, paragraph)), isWhole: false };
  const word = head.lastIndexOf(" ");
  return { text: closeFence(`${head.slice(0, word > 0 ? word : most)}…`), isWhole: false };
}

/** A listing that was cut in the middle must not swallow what follows it. */
function closeFence(text: string): string {
  const fences = text.match(/^```/gm)?.length ?? 0;
  return fences % 2 === 1 ? `${text}\n\`\`\`` : text;
}

/** The pictures of an entry that its text does not show already. */
export function picturesBesideText<Picture extends { id: string }>(
  body: string,
  pictures: readonly Picture[],
): Picture[] {
  return pictures.filter((picture) => !body.includes(picture.id));
}

/** The text without the places where it shows the picture. */
export function withoutPicture(body: string, id: string): string {
  return body.replace(/\n*!\[[^\]]*\]\(([^)\s]*)\)/g, (place, address: string) => (address.includes(id) ? "" : place));
}
