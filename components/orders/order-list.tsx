"use client";

import { useIsFetching } from "@tanstack/react-query";
import { useView } from "@/components/store/use-book";
import { useToday } from "@/components/store/use-today";
import { Button, ButtonLink } from "@/components/ui/button";
import { Card, Rows } from "@/components/ui/card";
import { Empty } from "@/components/ui/empty";
import { Choice } from "@/components/ui/field";
import { Notice } from "@/components/ui/notice";
import { Progress } from "@/components/ui/progress";
import { dueWords } from "@/lib/orders/day-words";
import { isShow, ordersCountWords, PAGE } from "@/lib/orders/list-place";
import { orderListQuery, type OrderListShow } from "@/lib/store/queries/orders";
import { OrderRow } from "./order-row";
import { setOrdersPlace, useOrdersPlace } from "./use-orders-place";

const shows = [
  { value: "open", label: "Open" },
  { value: "owing", label: "Owing" },
  { value: "all", label: "All" },
] as const;

/** Orders: open ones by their day, those with money to come, or all. `chosen` is the one whose card stands beside. */
export function OrderList({ chosen }: { chosen?: string | null }) {
  const { show, limit } = useOrdersPlace();
  const args = { show, limit };
  const { view, state } = useView(orderListQuery, args);
  const fetching = useIsFetching({ queryKey: [orderListQuery.name, args] }) > 0;
  const today = useToday();
  const shown = view.items.length;
  const none = shown === 0 && state === "known" && !fetching;

  return (
    <>
      <Choice
        bare
        label="Which orders"
        name="orders-shown"
        options={shows}
        value={show}
        onChange={(event) => {
          const value: string = event.target.value;
          if (isShow(value)) setOrdersPlace({ show: value, limit: PAGE });
        }}
      />
      {state === "opening" && <Progress label="Opening the book" />}
      {state === "failed" && (
        <Notice tone="wrong" title="The list did not open. Close Notchbook and open it again." />
      )}
      <p role="status" className={none ? "sr-only" : "text-soft"}>
        {none && "Nothing here"}
        {shown > 0 && ordersCountWords(show, shown, view.more)}
      </p>
      {none && <NoOrders show={show} />}
      {shown > 0 && (
        <Card flush aria-label={show === "owing" ? "Orders with money to come" : "Orders"}>
          <Rows>
            {view.items.map((item) => (
              <OrderRow
                key={item.order.id}
                item={item}
                day={dueWords(item.order, today)}
                chosen={item.order.id === chosen}
              />
            ))}
          </Rows>
        </Card>
      )}
      {view.more && (
        <Button
          full
          onClick={() => setOrdersPlace({ show, limit: limit + PAGE })}
          busy={fetching && shown < limit}
        >
          Show more
        </Button>
      )}
    </>
  );
}

function NoOrders({ show }: { show: OrderListShow }) {
  if (show === "owing")
    return <Empty say="Nobody owes anything. Orders with money to come, or to give back, stand here." />;
  return (
    <Empty
      say={
        show === "open" ? (
          <>
            <p className="font-semibold">No order is open.</p>
            <p>Here stands what is agreed and not handed over yet, the soonest due first.</p>
          </>
        ) : (
          <>
            <p className="font-semibold">Here stand your orders.</p>
            <p>Each with its garments, the price, what was paid, and the day it is due.</p>
          </>
        )
      }
      action={
        <ButtonLink href="/orders/new">
          {show === "open" ? "Take an order" : "Take the first order"}
        </ButtonLink>
      }
    />
  );
}
