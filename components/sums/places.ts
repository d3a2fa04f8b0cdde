/** Where the screens of sums lead back to, and how they are reached. */
export const backToSums = { href: "/sums", label: "Sewing sums" };

/** A new sum of this kind, to be put on this order; "" for none. */
export function newSumHref(kind: string, orderId: string): string {
  return `/sums/one?kind=${kind}${orderId === "" ? "" : `&order=${orderId}`}`;
}

export const sumHref = (id: string): string => `/sums/one?id=${id}`;
