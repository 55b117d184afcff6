import 'server-only';
import { inArray } from 'drizzle-orm';
import type { Tx } from '@/db/client';
import { accessTokens, people } from '@/db/schema/people';

const UUID = /^[0-9a-f]{8}(-[0-9a-f]{4}){3}-[0-9a-f]{12}$/i;
const TOKEN = 'token ';

/** The actors of the history as a reader knows them: a person by name, a program by the label of its token. */
export const whoTheyAre = async (tx: Tx, actors: readonly string[]): Promise<(actor: string) => string> => {
  const persons = actors.filter((actor) => UUID.test(actor));
  const tokens = actors.filter((actor) => actor.startsWith(TOKEN)).map((actor) => actor.slice(TOKEN.length));
  const names = new Map<string, string>();
  if (persons.length) {
    const rows = await tx.select({ id: people.id, name: people.name }).from(people).where(inArray(people.id, persons));
    for (const { id, name } of rows) names.set(id, name);
  }
  const known = tokens.filter((id) => UUID.test(id));
  if (known.length) {
    const rows = await tx
      .select({ id: accessTokens.id, label: accessTokens.label })
      .from(accessTokens)
      .where(inArray(accessTokens.id, known));
    for (const { id, label } of rows) names.set(`${TOKEN}${id}`, `program “${label}”`);
  }
  return (actor) => {
    const name = names.get(actor);
    if (name) return name;
    if (UUID.test(actor)) return 'somebody who has left the company';
    return actor.startsWith(TOKEN) ? 'a program' : actor;
  };
};
