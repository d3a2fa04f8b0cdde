/** How far down the arm a plain sleeve reaches. */
export type Reach = "short" | "three-quarter" | "long";

export const reaches: readonly { value: Reach; label: string }[] = [
  { value: "short", label: "Short" },
  { value: "three-quarter", label: "Three-quarter" },
  { value: "long", label: "Long" },
];
