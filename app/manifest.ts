import { type MetadataRoute } from "next";
import { light } from "../tailwind.config";

const shortcutIcon = [{ src: "/icons/icon-192.png", sizes: "192x192", type: "image/png" }];

/** What the phone needs to keep the app beside its own. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    id: "/",
    name: "Notchbook",
    short_name: "Notchbook",
    description:
      "Clients, measurements, sleeves, orders and receipts of a home sewing workshop, kept on the phone and working without data.",
    lang: "en-GB",
    dir: "ltr",
    start_url: "/",
    scope: "/",
    display: "standalone",
    theme_color: light.paper,
    background_color: light.paper,
    categories: ["business", "productivity", "utilities"],
    icons: [
      { src: "/icons/icon-192.png", sizes: "192x192", type: "image/png", purpose: "any" },
      { src: "/icons/icon-512.png", sizes: "512x512", type: "image/png", purpose: "any" },
      { src: "/icons/maskable-192.png", sizes: "192x192", type: "image/png", purpose: "maskable" },
      { src: "/icons/maskable-512.png", sizes: "512x512", type: "image/png", purpose: "maskable" },
      // Next's type leaves out this purpose of the Web Application Manifest; phones with themed icons read it.
      {
        src: "/icons/monochrome-512.png",
        sizes: "512x512",
        type: "image/png",
        purpose: "monochrome" as "any",
      },
    ],
    shortcuts: [
      {
        name: "New measure",
        description: "Take a set of measurements",
        url: "/measure",
        icons: shortcutIcon,
      },
      { name: "New order", description: "Take an order", url: "/orders/new", icons: shortcutIcon },
      {
        name: "Draft a sleeve",
        description: "From four figures",
        url: "/sleeves/draft",
        icons: shortcutIcon,
      },
    ],
    screenshots: [
      {
        src: "/screens/today.png",
        sizes: "720x1480",
        type: "image/png",
        form_factor: "narrow",
        label: "What today asks for",
      },
      {
        src: "/screens/measure.png",
        sizes: "720x1480",
        type: "image/png",
        form_factor: "narrow",
        label: "Taking a measurement",
      },
      {
        src: "/screens/sleeve.png",
        sizes: "720x1480",
        type: "image/png",
        form_factor: "narrow",
        label: "A sleeve, checked before cutting",
      },
      {
        src: "/screens/wide.png",
        sizes: "1280x800",
        type: "image/png",
        form_factor: "wide",
        label: "Clients, and the one chosen beside them",
      },
    ],
  };
}
