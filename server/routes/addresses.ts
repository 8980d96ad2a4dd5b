import { IdParams } from "#shared/schemas/common";
import { Address, AddressList } from "#shared/schemas/order";
import { saveAddress } from "../commands/saveAddress";
import { inTransaction } from "../db/inTransaction";
import { AppError } from "../errors/AppError";
import { type Endpoint, endpoint } from "../http/endpoint";
import { SavedAddress } from "../models/SavedAddress";

const tag = "Addresses";
const Saved = AddressList.shape.items.element;

const present = ({ id, name, line1, line2, postcode, town, region, country }: SavedAddress) => ({
  id,
  name,
  line1,
  line2,
  postcode,
  town,
  region,
  country,
});

export function addressRoutes(): Endpoint[] {
  return [
    endpoint(
      {
        method: "get",
        path: "/addresses",
        summary: "Addresses used before, the newest first.",
        tag,
        access: "signed-in",
        answer: AddressList,
      },
      async ({ actor }) => {
        const rows = await SavedAddress.findAll({ where: { userId: actor.id }, order: [["createdAt", "DESC"]] });
        return { items: rows.map(present) };
      },
    ),
    endpoint(
      {
        method: "post",
        path: "/addresses",
        summary: "Keeps an address; one that is kept already is answered as it is.",
        tag,
        access: "signed-in",
        body: Address,
        answer: Saved,
        status: 201,
      },
      async ({ actor, body }) => {
        const saved = await inTransaction((transaction) => saveAddress(actor.id, body, transaction));
        if (!saved) throw new AppError("wrong-state", "Fifty addresses are kept already: take one out first");
        return present(saved);
      },
    ),
    endpoint(
      {
        method: "delete",
        path: "/addresses/:id",
        summary: "Forgets an address; orders keep theirs.",
        tag,
        access: "signed-in",
        params: IdParams,
      },
      async ({ actor, params }) => {
        const gone = await SavedAddress.destroy({ where: { id: params.id, userId: actor.id } });
        if (gone === 0) throw new AppError("not-found");
      },
    ),
  ];
}
