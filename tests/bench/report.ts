import { cpus, release, totalmem } from "node:os";

export interface Measured {
  what: string;
  value: string;
}

export function median(values: readonly number[]): number {
  const sorted = [...values].sort((a, b) => a - b);
  const middle = Math.floor(sorted.length / 2);
  return sorted.length % 2 ? sorted[middle]! : (sorted[middle - 1]! + sorted[middle]!) / 2;
}

export function percentile(values: readonly number[], share: number): number {
  const sorted = [...values].sort((a, b) => a - b);
  return sorted[Math.min(sorted.length - 1, Math.ceil(share * sorted.length) - 1)]!;
}

export const ms = (value: number): string => `${value < 10 ? value.toFixed(2) : Math.round(value)} ms`;
export const kb = (bytes: number): string => `${(bytes / 1000).toFixed(1)} KB`;
export const spread = (values: readonly number[]): string =>
  `median ${ms(median(values))}, 95th ${ms(percentile(values, 0.95))}, of ${values.length}`;

export function machine(browser: string): string {
  const [cpu] = cpus();
  return `${cpus().length} × ${cpu?.model.trim() ?? "unknown processor"}, ${Math.round(totalmem() / 2 ** 30)} GiB, Linux ${release()}, Node ${process.version}, ${browser}`;
}

/** The table as it stands in DEVELOPERS.md. */
export function table(title: string, rows: readonly Measured[]): string {
  return [
    title,
    "",
    "| what | measured |",
    "| --- | --- |",
    ...rows.map(({ what, value }) => `| ${what} | ${value} |`),
  ].join("\n");
}
