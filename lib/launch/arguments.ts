import { parseArgs } from 'node:util';
import { UsageError } from './command';

/**
 * The named values of the command line, `--name "…"` each; throws a sentence with the usage when one is unknown, needed
 * and missing, or empty.
 */
export const namedValues = <Name extends string>(
  names: Record<Name, 'needed' | 'optional'>,
  usage: string,
): Record<Name, string | undefined> => {
  const fail = (sentence: string) => new UsageError(`${sentence}\nUsage: ${usage}`);
  const all = Object.keys(names) as Name[];
  const options = Object.fromEntries(all.map((name) => [name, { type: 'string' as const }]));
  const parse = () => {
    try {
      return parseArgs({ args: process.argv.slice(2), options }).values;
    } catch (error) {
      throw fail(error instanceof Error ? error.message : String(error));
    }
  };
  const values = parse();
  const given = (name: Name) => {
    const value = values[name];
    return typeof value === 'string' ? value.trim() : undefined;
  };
  for (const name of all) {
    if (names[name] === 'needed' && given(name) === undefined) throw fail(`--${name} is missing.`);
    if (given(name) === '') throw fail(`--${name} is empty.`);
  }
  // Every name of the record is visited, so the keys are exactly those of the type.
  return Object.fromEntries(all.map((name) => [name, given(name)])) as Record<Name, string | undefined>;
};
