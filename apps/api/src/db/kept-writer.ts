import type { Sequelize } from 'sequelize';

/**
 * Keeps the connection of a transaction for the next one. Sequelize would open a connection for
 * each and read the whole schema anew, which costs several times what a small write does; as there
 * is one writer at a time, one connection serves them all. A connection whose COMMIT or ROLLBACK
 * failed is not handed back here and never used again.
 */
export function keepWriter(sequelize: Sequelize): void {
  const manager = sequelize.connectionManager;
  const open = manager.getConnection.bind(manager);
  const close = manager.releaseConnection.bind(manager);
  let idle: object | null = null;

  manager.getConnection = async (options) => {
    if (idle === null || !isForTransaction(options)) return open(options);
    const kept = idle;
    idle = null;
    return kept;
  };

  // Sequelize still lists the kept connection under its first name, and closes it with the rest.
  manager.releaseConnection = (connection) => {
    if (idle === null && isForTransaction(connection)) idle = connection;
    else close(connection);
  };
}

/** Transactions and their connections have a name of their own; reading shares one. */
function isForTransaction(named: object): boolean {
  return 'uuid' in named && named.uuid !== undefined && named.uuid !== 'default';
}
