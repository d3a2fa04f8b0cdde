import { Notice } from "@/components/ui/notice";
import { namesInWords } from "@/lib/clients/list-words";
import { type OrderCaution } from "@/lib/orders/order-cautions";

/** What to mind before cutting, each with whom it is about and where it is from. */
export function CautionsNotice({ cautions, live }: { cautions: readonly OrderCaution[]; live?: boolean }) {
  if (cautions.length === 0) return null;
  return (
    <Notice tone="look" live={live} title="Mind before cutting">
      <ul className="grid gap-3">
        {cautions.map(({ key, say, source, names }) => (
          <li key={`${key} ${say}`}>
            {names.length > 0 && <p className="font-semibold">{namesInWords(names)}</p>}
            <p>{say}</p>
            <p className="text-sm text-soft">From: {source}</p>
          </li>
        ))}
      </ul>
    </Notice>
  );
}
