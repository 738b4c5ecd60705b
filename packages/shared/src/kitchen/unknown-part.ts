/**
 * A design names something the menu does not have. `path` leads to the field inside the design
 * (`['cake', 'tiers', 0, 'spongeId']`), so that the API can answer at that field.
 */
export class UnknownPart extends Error {
  readonly path: readonly (string | number)[];
  readonly id: string;

  constructor(path: readonly (string | number)[], id: string) {
    super(`The menu has no "${id}".`);
    this.name = 'UnknownPart';
    this.path = path;
    this.id = id;
  }
}
