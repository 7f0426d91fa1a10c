import type { Query, QuerySpec } from './query.ts';
import type { SchemaName } from './schemas.ts';

/** Answers a request whose query and kind of body are already known to be good. */
export type Handler = (request: Request, query: Query, type: string) => Response | Promise<Response>;

/** What a body holds: JSON of a schema, or words about something else. */
type Content = SchemaName | { readonly lines: string } | { readonly other: string };

/** One address of the API, described once for the server and for its readers. */
export interface Route {
  readonly method: 'get' | 'post';
  readonly path: string;
  readonly summary: string;
  readonly query: QuerySpec;
  /** What the names in the query mean. */
  readonly meaning: Readonly<Record<string, string>>;
  /** Kinds of body that it takes; none for GET. */
  readonly takes: Readonly<Record<string, Content>>;
  /** A body that it takes; the example of an end where absent. */
  readonly example?: unknown;
  readonly gives: Readonly<Record<string, Content>>;
  /** Status codes of the problems that it may answer with. */
  readonly problems: readonly number[];
  readonly handler: Handler;
}
