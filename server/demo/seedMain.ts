import { PhotoStore } from "../adapters/PhotoStore";
import { readConfig } from "../config";
import { connect } from "../db/connect";
import { seedDemo } from "./seedDemo";

const config = readConfig(process.env);
if (config.mode === "production") throw new Error("Production has no demo data");

const sequelize = connect(config.databaseUrl, { poolSize: 4 });
const photos = process.env.DEMO_PHOTOS === "none" ? null : new PhotoStore(config.dataDir);
const done = await seedDemo(photos, new Date());
await sequelize.close();
process.stdout.write(done ? "demo data is in place\n" : "demo data was there\n");
