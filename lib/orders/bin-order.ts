import { type BinQuestion } from "@/lib/clients/bin-question";
import { type OrderWithMoney } from "@/lib/store/queries/order-money";
import { orderName } from "./order-name";

/** Before an order is put in the bin: what goes along, and what money stands out. `money` says an amount. */
export function orderBinQuestion(
  { order, payments, sums }: OrderWithMoney,
  money: (minor: number) => string,
): BinQuestion {
  const held = sums.receivedMinor - sums.givenBackMinor;
  return {
    title: `Put “${orderName(order)}” in the bin?`,
    say: [
      "Its garments and prices go along. Figures and sleeves stay with their wearers.",
      ...(payments.length > 0
        ? [
            held > 0
              ? `${money(held)} was received on it. The receipts stay in the book.`
              : "Its receipts stay in the book.",
          ]
        : []),
      ...(sums.balanceMinor > 0 ? [`${money(sums.balanceMinor)} is still to come in.`] : []),
      ...(sums.balanceMinor < 0 ? [`${money(-sums.balanceMinor)} is still to be given back.`] : []),
      "All of it can be brought back from the bin.",
    ],
  };
}
