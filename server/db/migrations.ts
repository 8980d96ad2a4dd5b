import type { Migration } from "./Migration";
import { accounts } from "./migrations/0001-accounts";
import { workshops } from "./migrations/0002-workshops";
import { families } from "./migrations/0003-families";
import { parts } from "./migrations/0004-parts";
import { orders } from "./migrations/0005-orders";
import { ledger } from "./migrations/0006-ledger";
import { mails } from "./migrations/0007-mails";
import { searchVocabulary } from "./migrations/0008-search-vocabulary";
import { itemSizes } from "./migrations/0009-item-sizes";
import { parcelDispatch } from "./migrations/0011-parcel-dispatch";

/** Every migration, oldest first. */
export const migrations: readonly Migration[] = [
  accounts,
  workshops,
  families,
  parts,
  orders,
  ledger,
  mails,
  searchVocabulary,
  itemSizes,
  parcelDispatch,
];
