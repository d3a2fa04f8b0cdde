/** Every query by its name: the database's worker is asked by name. */
import { type Query } from "../query";
import { binQuery } from "./bin";
import { clientCardQuery, clientListQuery } from "./clients";
import { chosenWearersQuery, manyWearersQuery } from "./many";
import { orderCardQuery, orderListQuery, orderPeopleQuery, receiptQuery } from "./orders";
import { sleeveListQuery, sleevesQuery } from "./sleeves";
import { sumListQuery, sumQuery } from "./sums";
import { todayQuery } from "./today";
import { setCardQuery, wearerCardQuery } from "./wearers";
import { workshopQuery } from "./workshop";

// eslint-disable-next-line @typescript-eslint/no-explicit-any -- each query has arguments of its own
const queries: Query<any, any>[] = [
  workshopQuery,
  todayQuery,
  clientListQuery,
  clientCardQuery,
  wearerCardQuery,
  setCardQuery,
  manyWearersQuery,
  chosenWearersQuery,
  sleeveListQuery,
  sleevesQuery,
  orderListQuery,
  orderCardQuery,
  orderPeopleQuery,
  receiptQuery,
  sumListQuery,
  sumQuery,
  binQuery,
];

export const queriesByName = new Map(queries.map((query) => [query.name, query]));
