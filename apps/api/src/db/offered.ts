import type { Order } from 'sequelize';

/** As the studio has put them. */
export const inOrder: Order = [['position', 'ASC']];

/** Finds what is offered now, in the studio's own order; the catalogue archives, never deletes. */
export const offered = { where: { archivedAt: null }, order: inOrder };
