import { Notice } from "@/components/ui/notice";
import { namesInWords } from "@/lib/clients/list-words";
import { type OrderCaution } from "@/lib/orders/order-cautions";

export interface CautionsNoticeProps {
  cautions: readonly OrderCaution[];
  /** Once the cloth is cut they are there to be looked up; before that they stand open. */
  folded?: boolean;
}

/** What to mind before cutting, each with whom it is about and where it is from. */
export function CautionsNotice({ cautions, folded }: CautionsNoticeProps) {
  if (cautions.length === 0) return null;
  if (folded)
    return (
      <details className="rounded border-2 border-s-8 border-thread bg-well px-3">
        <summary className="flex min-h-key items-center font-semibold">Cautions for this order</summary>
        <div className="pb-3">
          <Cautions cautions={cautions} />
        </div>
      </details>
    );
  return (
    <Notice tone="look" title="Mind before cutting">
      <Cautions cautions={cautions} />
    </Notice>
  );
}

function Cautions({ cautions }: Pick<CautionsNoticeProps, "cautions">) {
  return (
    <ul className="grid gap-3">
      {cautions.map(({ key, say, source, names }) => (
        <li key={`${key} ${say}`}>
          {names.length > 0 && <p className="font-semibold">{namesInWords(names)}</p>}
          <p>{say}</p>
          <p className="text-sm text-soft">From: {source}</p>
        </li>
      ))}
    </ul>
  );
}
