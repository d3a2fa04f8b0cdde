import { Card, RowLink, Rows } from "@/components/ui/card";
import { Money } from "@/components/ui/money";
import { balanceWords, stageWords } from "@/lib/clients/order-words";
import { formatDay } from "@/lib/people/format-day";
import { type OrderWithMoney } from "@/lib/store/queries/order-money";

/** A client's orders, newest first: stage, day, and what is to come. */
export function ClientOrders({ orders }: { orders: OrderWithMoney[] }) {
  return (
    <section aria-labelledby="orders" className="grid gap-3">
      <h2 id="orders" className="font-figure text-lg font-bold">
        Orders
      </h2>
      {orders.length === 0 ? (
        <p className="text-soft">
          None yet. “New order” sets down what is to be sewn, the price and the day.
        </p>
      ) : (
        <Card flush aria-label="Orders, newest first">
          <Rows>
            {orders.map(({ order, sums }) => (
              <RowLink
                key={order.id}
                href={`/orders/card?id=${order.id}`}
                title={order.occasion || `Order of ${formatDay(order.agreedOn, { style: "short" })}`}
                sub={
                  <>
                    {stageWords(order.stage)}
                    {order.dueOn && order.stage !== "handed-over" && (
                      <>, due {formatDay(order.dueOn, { style: "short" })}</>
                    )}
                  </>
                }
                figure={
                  <span className="block text-end">
                    {sums.balanceMinor !== 0 && (
                      <Money
                        minor={Math.abs(sums.balanceMinor)}
                        currency={order.currency}
                        className="block"
                      />
                    )}
                    <span className="block font-sans text-sm font-normal">{balanceWords(sums)}</span>
                  </span>
                }
              />
            ))}
          </Rows>
        </Card>
      )}
    </section>
  );
}
