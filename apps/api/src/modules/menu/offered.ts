/** Finds what is offered now, in the studio's own order; the catalogue archives, never deletes. */
export const offered = {
  where: { archivedAt: null },
  order: [['position', 'ASC'] as [string, string]],
};
