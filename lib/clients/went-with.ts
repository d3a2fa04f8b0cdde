import { type Client, type Order } from "@/lib/records/types";

/** Orders that went into the bin in the same change as their client, and come back with it. */
export function wentWithClient<T extends Pick<Order, "clientId" | "removedAt">>(
  client: Pick<Client, "id" | "removedAt">,
  orders: readonly T[],
): T[] {
  return client.removedAt === null
    ? []
    : orders.filter((order) => order.clientId === client.id && order.removedAt === client.removedAt);
}
