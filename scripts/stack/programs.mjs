import { fromRoot } from '../lib/root.mjs';

const tsx = fromRoot('node_modules/tsx/dist/cli.mjs');

/** The built programs, as production runs them. */
const built = {
  api: { args: ['--enable-source-maps', 'apps/api/dist/main.js'] },
  worker: { args: ['--enable-source-maps', 'apps/api/dist/worker.js'] },
  command: { args: ['--enable-source-maps', 'apps/api/dist/command.js'] },
  standIns: { args: ['--enable-source-maps', 'packages/fakes/dist/start.js'] },
};

/** The sources, restarted when they change. tsx reads the tsconfig of its working folder, hence each `cwd`. */
const watched = {
  api: { args: [tsx, 'watch', '--clear-screen=false', 'src/main.ts'], cwd: fromRoot('apps/api') },
  worker: { args: [tsx, 'watch', '--clear-screen=false', 'src/worker.ts'], cwd: fromRoot('apps/api') },
  command: { args: [tsx, 'src/command.ts'], cwd: fromRoot('apps/api') },
  standIns: { args: [tsx, 'src/start.ts'], cwd: fromRoot('packages/fakes') },
};

/** The four programs of a stack: how Node is called for each. */
export const programsOf = ({ watch }) => (watch ? watched : built);
