import { openDatabase } from './local';

// For pg_dump and psql: the address of the database in use, as its administrator. Leaves a cluster it started running,
// since whoever asked is about to connect.
void openDatabase().then(
  ({ urls }) => console.log(urls.admin),
  (error: unknown) => {
    console.error(error instanceof Error ? error.message : error);
    process.exit(1);
  },
);
