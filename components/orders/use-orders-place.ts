import { tabPlace } from "@/components/store/tab-place";
import { readOrdersPlace } from "@/lib/orders/list-place";

export const { set: setOrdersPlace, use: useOrdersPlace } = tabPlace(
  "notchbook:orders-list",
  readOrdersPlace,
);
