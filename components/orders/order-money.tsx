import { Pair } from "@/components/money/pair";
import { AppLink } from "@/components/ui/app-link";
import { Button } from "@/components/ui/button";
import { Card, RowLink, Row, Rows } from "@/components/ui/card";
import { Money } from "@/components/ui/money";
import { formatDay } from "@/lib/people/format-day";
import { balanceSaid, kindWords, methodWords } from "@/lib/receipts/document";
import { type OrderCardView } from "@/lib/store/queries/orders";

/** The balance, largest of all; below it what it comes from. */
export function BalanceCard({
  view,
  onTake,
  onGiveBack,
}: {
  view: OrderCardView;
  onTake: () => void;
  onGiveBack: () => void;
}) {
  const { order, sums, lines, payments } = view;
  const { label, minor } = balanceSaid(sums.balanceMinor);
  const unpriced = lines.length === 0 && payments.length === 0;
  const held = sums.receivedMinor - sums.givenBackMinor;
  const money = (amount: number) => <Money minor={amount} currency={order.currency} />;
  return (
    <Card aria-labelledby="balance">
      <h2 id="balance" className="font-semibold">
        {unpriced ? "No price yet" : label}
      </h2>
      {unpriced ? (
        <p className="mt-1">
          <AppLink href={`/orders/change?id=${order.id}`} className="inline-flex min-h-target items-center">
            Set the price down
          </AppLink>
        </p>
      ) : (
        <>
          <p className="text-figure font-bold">{money(minor)}</p>
          <dl className="mt-2">
            <Pair value={money(sums.totalMinor)}>Total</Pair>
            <Pair value={money(sums.receivedMinor)}>Received</Pair>
            {sums.givenBackMinor > 0 && <Pair value={money(sums.givenBackMinor)}>Given back</Pair>}
          </dl>
        </>
      )}
      <div className="mt-3 flex flex-wrap gap-2">
        <Button onClick={onTake}>Take money</Button>
        {held > 0 && <Button onClick={onGiveBack}>Give money back</Button>}
      </div>
    </Card>
  );
}

/** What was agreed, line by line. */
export function PriceLines({ view: { order, lines, sums } }: { view: OrderCardView }) {
  if (lines.length === 0) return null;
  return (
    <section aria-labelledby="prices" className="grid gap-3">
      <h2 id="prices" className="font-figure text-lg font-bold">
        Price
      </h2>
      <Card flush aria-label="Price lines">
        <Rows>
          {lines.map(({ id, text, quantity, unitMinor }) => (
            <Row
              key={id}
              title={text}
              sub={
                quantity > 1 && (
                  <>
                    {quantity} × <Money minor={unitMinor} currency={order.currency} />
                  </>
                )
              }
              figure={<Money minor={quantity * unitMinor} currency={order.currency} />}
            />
          ))}
          <Row title="Total" figure={<Money minor={sums.totalMinor} currency={order.currency} />} />
        </Rows>
      </Card>
    </section>
  );
}

/** Money that changed hands, each with its receipt. */
export function Payments({ view: { order, payments, receipts } }: { view: OrderCardView }) {
  if (payments.length === 0) return null;
  return (
    <section aria-labelledby="payments" className="grid gap-3">
      <h2 id="payments" className="font-figure text-lg font-bold">
        Money received and given back
      </h2>
      <Card flush aria-label="Payments, the first first">
        <Rows>
          {payments.map(({ id, kind, method, amountMinor, paidOn, note }) => {
            const receipt = receipts.find(({ paymentId }) => paymentId === id);
            const signed = kind === "giving-back" ? -amountMinor : amountMinor;
            const said = {
              title: kindWords(kind),
              sub: (
                <>
                  <span className="block">
                    {formatDay(paidOn, { style: "short" })}, {methodWords(method).toLowerCase()}
                  </span>
                  {note && <span className="block wrap-anywhere">{note}</span>}
                  {receipt && (
                    <span className="block">
                      Receipt <span className="whitespace-nowrap">{receipt.number}</span>
                    </span>
                  )}
                </>
              ),
              figure: <Money minor={signed} currency={order.currency} />,
            };
            return receipt ? (
              <RowLink key={id} href={`/orders/receipt?id=${receipt.id}`} {...said} />
            ) : (
              <Row key={id} {...said} />
            );
          })}
        </Rows>
      </Card>
    </section>
  );
}
