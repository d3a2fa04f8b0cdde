import { cx } from "@/components/ui/cx";
import { currency as currencyOf } from "@/lib/money/currencies";
import { formatMoney } from "@/lib/money/format-money";

export type MoneyProps = {
  /** In the currency's smallest unit. */
  minor: number;
  /** ISO 4217 code, as the workshop has it; one that nobody pays in is shown with its bare figure. */
  currency: string;
  className?: string;
};

/** An amount with tabular figures. */
export function Money({ minor, currency, className }: MoneyProps) {
  const known = currencyOf(currency);
  return (
    <span className={cx("figures whitespace-nowrap", className)}>
      {known ? formatMoney(minor, known) : `${minor} ${currency}`}
    </span>
  );
}
