import { type CSSProperties } from "react";
import { Tape } from "@/components/ui/tape";
import { Notch } from "@/components/ui/notch";
import { longDate } from "@/lib/pdf/long-date";
import { type ReceiptDocument } from "@/lib/pdf/receipt-document";
import { type Unit } from "@/lib/records/types";
import { Pair } from "./pair";

const words = {
  Receipt: { from: "Received from", amount: "Amount received", now: "This payment" },
  "Money given back": { from: "Given back to", amount: "Amount given back", now: "Given back now" },
} as const;

/** A receipt as it is going to be printed. */
export function ReceiptCard({ doc, unit }: { doc: ReceiptDocument; unit: Unit }) {
  const said = words[doc.title];
  const single = doc.lines.every(({ quantity }) => quantity === "1");
  const pays = [said.now, doc.payment.label.toLowerCase(), doc.payment.methodLabel.toLowerCase()].filter(
    Boolean,
  );
  return (
    <article aria-label={`${doc.title} ${doc.number}`} className="border-2 border-edge bg-well">
      <Tape unit={unit} className="rotate-180 text-ink" />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-5 p-4 sm:p-6">
        <header className="flex flex-wrap items-start justify-between gap-x-6 gap-y-3">
          <div className="min-w-0 flex-1 basis-48">
            <p className="font-figure text-xl font-bold wrap-anywhere">{doc.seller.name}</p>
            <Lines lines={doc.seller.lines} />
          </div>
          <div className="sm:text-end">
            <h2 className="font-figure text-lg font-bold">{doc.title}</h2>
            <p className="figures font-bold whitespace-nowrap">{doc.number}</p>
            <p>{longDate(doc.issuedOn, doc.lang)}</p>
          </div>
        </header>
        <div className="grid gap-4 sm:grid-cols-2">
          <div className="min-w-0">
            <p className="text-sm font-semibold text-soft">{said.from}</p>
            <p className="text-lg font-bold wrap-anywhere">{doc.buyer.name}</p>
            <Lines lines={doc.buyer.lines} />
          </div>
          <div className="min-w-0">
            <p className="text-sm font-semibold text-soft">For</p>
            <p className="text-lg font-bold wrap-anywhere">{doc.orderTitle}</p>
          </div>
        </div>
        <div className="card p-4 pt-5" style={{ "--behind": "var(--well)" } as CSSProperties}>
          <Notch label="" className="absolute start-5 top-0 h-3" />
          <div className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1">
            <div>
              <p className="font-bold">{said.amount}</p>
              <p>
                {doc.payment.label
                  ? [doc.payment.label, doc.payment.methodLabel.toLowerCase()].filter(Boolean).join(", ")
                  : doc.payment.methodLabel}
              </p>
            </div>
            <p className="figures ms-auto text-[clamp(1.5rem,11vw,2.75rem)] leading-none font-bold wrap-anywhere">
              {doc.payment.amountText}
            </p>
          </div>
        </div>
        <dl className="grid">
          {doc.lines.map((line, i) => (
            <Pair key={i} value={line.amountText} className={i > 0 ? "border-t border-line" : undefined}>
              <span className="block wrap-anywhere">{line.text}</span>
              {!single && (
                <span className="block text-soft">
                  {line.quantity} × <span className="whitespace-nowrap">{line.unitText}</span>
                </span>
              )}
            </Pair>
          ))}
          <Pair value={doc.totalText} className="border-t-2 border-ink font-bold">
            Total
          </Pair>
        </dl>
        <dl className="grid">
          {doc.earlier.map(({ date, label, number, amountText }, i) => (
            <Pair key={i} value={amountText}>
              {i === 0 && <span className="block text-sm font-semibold text-soft">Paid before</span>}
              {[longDate(date, doc.lang), label, number].filter(Boolean).join(", ")}
            </Pair>
          ))}
          <Pair value={doc.payment.amountText}>{pays.join(", ")}</Pair>
          <Pair value={doc.receivedText} className="font-bold">
            Received in all
          </Pair>
          <Pair
            value={doc.balanceText}
            className="mt-2 border-y-4 border-double border-ink text-xl font-bold"
          >
            {doc.balanceLabel}
          </Pair>
        </dl>
        {doc.thanks && <p className="font-bold">{doc.thanks}</p>}
        {doc.cautions.length > 0 && (
          <section className="grid gap-1">
            <h3 className="font-semibold text-soft">Take care</h3>
            <ul className="grid gap-1">
              {doc.cautions.map((caution) => (
                <li key={caution} className="flex items-baseline gap-2">
                  <Notch label="" className="shrink-0" />
                  <span>{caution}</span>
                </li>
              ))}
            </ul>
          </section>
        )}
      </div>
    </article>
  );
}

function Lines({ lines }: { lines: readonly string[] }) {
  return lines.map((line, i) => (
    <p key={i} className="wrap-anywhere">
      {line}
    </p>
  ));
}
