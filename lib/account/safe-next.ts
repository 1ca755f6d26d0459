/** Where people land when nothing else was asked for. */
export const HOME = "/projects";

/** A path of our own to go on to, never another site's: "//host" and "/\host" are addresses of others to a browser. */
export function safeNext(path: string | undefined): string {
  if (!path || !/^\/(?![/\\])/.test(path) || /[\u0000-\u001f\u007f\\]/.test(path)) return HOME;
  return path;
}
