import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { parseArgs } from 'node:util';
import { makeGallery, type Wanted } from '@/tests/gallery/gallery';
import { withDemoServer } from './demo-server';
import { LOCAL_FOLDER, say } from './local';

const list = { type: 'string', multiple: true } as const;

/**
 * `npm run gallery` pictures every screen in every state, theme and width into .local/gallery;
 * `npm run gallery -- --screen trends --theme dark --width 390` a part of them.
 */
const main = async (): Promise<void> => {
  const wanted: Wanted = parseArgs({ options: { screen: list, state: list, theme: list, width: list } }).values;
  const folder = join(LOCAL_FOLDER, 'gallery');
  rmSync(folder, { recursive: true, force: true });
  mkdirSync(folder, { recursive: true });
  const count = await withDemoServer('gallery', ({ address, signIns }) =>
    makeGallery(address, signIns, folder, wanted),
  );
  say(`${count} pictures: ${join(folder, 'index.html')}`);
};

for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) process.on(signal, () => process.exit(130));
main().then(
  () => process.exit(0),
  (error: unknown) => {
    console.error(error);
    process.exit(1);
  },
);
