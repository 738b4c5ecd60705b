/** One change of the schema, in SQL that never changes once released. */
export interface Migration {
  /** Fixed: the database remembers it. */
  readonly name: string;
  readonly sql: string;
}
