/**
 * @typedef {object} ServerPlace
 * @property {string} dataFolder
 * @property {string} socket
 * @property {string} pidFile
 * @property {string} logFile
 * @property {string} initFile SQL run before the first connection is taken
 * @property {number} port
 */

/**
 * Arguments of a `mariadbd` that only this machine reaches.
 * @param {ServerPlace} place
 * @param {readonly string[]} [extra]
 * @returns {string[]}
 */
export function serverArguments(place, extra = []) {
  return [
    '--no-defaults',
    `--datadir=${place.dataFolder}`,
    `--socket=${place.socket}`,
    `--pid-file=${place.pidFile}`,
    `--log-error=${place.logFile}`,
    `--init-file=${place.initFile}`,
    `--port=${place.port}`,
    '--bind-address=127.0.0.1',
    '--skip-name-resolve',
    '--default-time-zone=+00:00',
    '--character-set-server=utf8mb4',
    '--max-allowed-packet=64M',
    // 0 and 2 can lose the last second after a crash; an acknowledged edit must be on disk.
    '--innodb-flush-log-at-trx-commit=1',
    ...runAs(),
    ...extra,
  ];
}

/** MariaDB refuses to run as root unless it is told to. */
export function runAs() {
  return process.getuid?.() === 0 ? ['--user=root'] : [];
}
