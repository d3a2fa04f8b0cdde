import { RowLink } from "@/components/ui/card";
import { cx } from "@/components/ui/cx";
import { Money } from "@/components/ui/money";
import { balanceWords, stageWords } from "@/lib/clients/order-words";
import { type DayWords } from "@/lib/orders/day-words";
import { forWhom, orderName } from "@/lib/orders/order-name";
import { type OrderListItem } from "@/lib/store/queries/orders";

/** A day as words at the end of a row; what is late stands out. */
export function DayMark({ words }: { words: DayWords | null }) {
  if (!words) return null;
  return (
    <span className={cx("block font-sans text-sm", words.late ? "font-bold text-pin" : "font-semibold")}>
      {words.say}
    </span>
  );
}

/** One order in a list: whose, what for, how far, when, and what is to come. */
export function OrderRow({
  item: { order, client, garments, wearers, sums },
  day,
  chosen,
  money = "said",
}: {
  item: OrderListItem;
  day: DayWords | null;
  chosen?: boolean;
  /** Default "said": a word, too, where nothing is owed. */
  money?: "said" | "owed";
}) {
  const who = forWhom(client?.name ?? "", wearers, garments);
  const owed = sums.balanceMinor !== 0;
  return (
    <RowLink
      href={`/orders/card?id=${order.id}`}
      chosen={chosen}
      title={client?.name ?? "A client who is not in the book"}
      sub={
        <>
          <span className="block wrap-anywhere">
            {[orderName(order), who].filter((part) => part !== "").join(", ")}
          </span>
          <span className="block">{stageWords(order.stage)}</span>
        </>
      }
      figure={
        <span className="block text-end">
          <DayMark words={day} />
          {owed && <Money minor={Math.abs(sums.balanceMinor)} currency={order.currency} className="block" />}
          {(owed || money === "said") && (
            <span className="block font-sans text-sm font-normal">{balanceWords(sums)}</span>
          )}
        </span>
      }
    />
  );
}
