/**
 * Body of the engine worker, the same in a browser and in Node. Plain JavaScript, because it is loaded as it stands:
 * by `worker_threads` from the project's folder, and by a browser from `public/vendor/`. A change here asks for a new
 * version in `version.json`.
 *
 * It only runs decks and brings back bytes and messages; whether a result counts is decided by `lib/spice/protocol`.
 *
 * The two inner doors of the package used here (its file system and `commandList`) are private to it, so its version is
 * pinned and `lib/spice/node-engine.test.ts` fails when they move.
 */

const resultFile = '/result.raw';
/** `destroy all` and `remcirc` last: without them each run leaves about 100 kB behind (`docs/engine.md` 1.1). */
const commands = [' ', 'source test.cir', 'run', `write ${resultFile}`, 'destroy all', 'remcirc'];
const fatalMessage = /fatal error in ngspice|ngspice-\S+ done/i;
const pollMs = 10;
const maxMessages = 1000;

/**
 * @param {typeof import('eecircuit-engine').Simulation} Simulation
 * @param {(message: object, transfer: ArrayBuffer[]) => void} post
 */
export async function openHost(Simulation, post) {
  // ngspice repeats every warning on the console, and a failed start prints the whole engine as one line.
  console.error = console.warn = console.info = console.log = () => {};
  try {
    const simulation = new Simulation();
    await simulation.start();
    const files = simulation.__getSpiceModuleForTests().FS;
    post({ type: 'ready' }, []);
    return (job) => runJob(simulation, files, job, post);
  } catch (error) {
    post({ type: 'failed', words: String(error).slice(0, 500) }, []);
    throw error;
  }
}

async function runJob(simulation, files, job, post) {
  files.writeFile('/out.raw', job.sentinel);
  remove(files, resultFile);
  simulation.setNetList(job.deck);
  simulation.commandList = commands;

  const watch = watchForFatal(simulation);
  const ending = await Promise.race([
    simulation.runSim().then(() => 'done', () => 'fatal'),
    watch.fatal,
  ]);
  watch.stop();

  const errors = simulation.getError().filter((line) => line.trim() !== '').slice(0, maxMessages);
  if (ending === 'fatal') return post({ type: 'fatal', id: job.id, errors }, []);
  const raw = read(files, resultFile);
  return post({ type: 'done', id: job.id, raw, errors }, raw === null ? [] : [raw.buffer]);
}

/** When ngspice ends itself, `runSim` never settles: only its messages tell. */
function watchForFatal(simulation) {
  let timer;
  const fatal = new Promise((resolve) => {
    timer = setInterval(() => {
      const said = `${simulation.getError().join('\n')}\n${simulation.getInfo()}`;
      if (fatalMessage.test(said)) resolve('fatal');
    }, pollMs);
  });
  return { fatal, stop: () => clearInterval(timer) };
}

function remove(files, path) {
  try {
    files.unlink(path);
  } catch {
    // Not there: the last run wrote nothing.
  }
}

function read(files, path) {
  try {
    return files.readFile(path);
  } catch {
    return null;
  }
}
