/**
 * Every screen that works without a line. The service worker keeps both answers of each (the page, and the
 * router's payload); a test compares this list with the folders of `app/`.
 */
export const screens = [
  "/",
  "/start",
  "/clients",
  "/clients/new",
  "/clients/card",
  "/clients/change",
  "/wearers/new",
  "/wearers/card",
  "/wearers/change",
  "/measure",
  "/measure/set",
  "/measure/history",
  "/sleeves",
  "/sleeves/draft",
  "/sleeves/marks",
  "/sleeves/full-size",
  "/sleeves/compare",
  "/sleeves/many",
  "/sums",
  "/sums/one",
  "/orders",
  "/orders/new",
  "/orders/card",
  "/orders/change",
  "/orders/receipt",
  "/settings",
  "/bin",
] as const;
