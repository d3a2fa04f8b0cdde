import { tabPlace } from "@/components/store/tab-place";
import { readListPlace } from "@/lib/clients/list-words";

export const { set: setListPlace, use: useListPlace } = tabPlace("notchbook:clients-list", readListPlace);
