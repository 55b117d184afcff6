import { mkdirSync, readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import type { z } from 'zod';
import { LOCAL_FOLDER } from '../local';

/** Where a runner of this process writes its report; removed when the process ends. */
export const reportFile = (kind: string): string => {
  const folder = join(LOCAL_FOLDER, 'reports');
  mkdirSync(folder, { recursive: true });
  const file = join(folder, `${kind}-${process.pid}.json`);
  process.on('exit', () => rmSync(file, { force: true }));
  return file;
};

/** A report as its schema says, or null when there is none or it is something else. */
export const readReport = <Report extends z.ZodType>(file: string, schema: Report): z.output<Report> | null => {
  try {
    return schema.parse(JSON.parse(readFileSync(file, 'utf8')));
  } catch {
    return null;
  }
};
