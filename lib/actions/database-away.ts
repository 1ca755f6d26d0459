/** Under this word a page that could not be read reaches the error page: of other errors only a number gets there. */
export const DATABASE_AWAY = "database-away";

/** The database did not answer while a page was read. Its text carries no query and no values. */
export class DatabaseAwayError extends Error {
  override name = "DatabaseAwayError";
  readonly digest = DATABASE_AWAY;
  constructor(cause: unknown) {
    super("The database does not answer.", { cause });
  }
}
