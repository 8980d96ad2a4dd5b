import { connect } from "./db/connect";
import { migrate } from "./db/migrate";

const databaseUrl = process.env.DATABASE_URL;
if (!databaseUrl) throw new Error("DATABASE_URL says which database to bring up to date");

const sequelize = connect(databaseUrl, { poolSize: 2 });
const done = await migrate(sequelize, databaseUrl);
await sequelize.close();
process.stdout.write(done.length > 0 ? `migrated: ${done.join(", ")}\n` : "schema is up to date\n");
