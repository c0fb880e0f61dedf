/**
 * SQL for `--init-file`: one statement a line, run at every start before the first connection is taken, so there is no
 * moment at which root has no password. Every account but root, the application's and MariaDB's own is dropped.
 * @param {{ rootPassword: string, account: string, accountPassword: string, databases: string, create?: string }} input passwords are letters
 *   and digits; `databases` is the pattern of database names the account may use (`_` and `%`
 *   escaped by the caller), `create` one that is made when it is not there
 */
export function accountsSql({ rootPassword, account, accountPassword, databases, create }) {
  for (const word of [rootPassword, account, accountPassword]) if (!/^[A-Za-z0-9_]+$/.test(word)) throw new Error('Passwords here are letters and digits');
  const user = `'${account}'@'127.0.0.1'`;
  return [
    `ALTER USER 'root'@'localhost' IDENTIFIED BY '${rootPassword}';`,
    `DELETE FROM mysql.global_priv WHERE NOT (User = 'root' AND Host = 'localhost') AND NOT (User = '${account}' AND Host = '127.0.0.1') AND User <> 'mariadb.sys';`,
    'FLUSH PRIVILEGES;',
    `CREATE USER IF NOT EXISTS ${user} IDENTIFIED BY '${accountPassword}';`,
    `ALTER USER ${user} IDENTIFIED BY '${accountPassword}';`,
    `GRANT ALL PRIVILEGES ON \`${databases}\`.* TO ${user};`,
    ...(create ? [`CREATE DATABASE IF NOT EXISTS \`${create}\` CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci;`] : []),
    '',
  ].join('\n');
}
