import type { MetadataRoute } from "next";

/** Lets a phone put Boardwake on its home screen; the bench then opens without the browser's bars. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    name: "Boardwake",
    short_name: "Boardwake",
    description: "Build log and bring-up tracker for machines made of several circuit boards.",
    start_url: "/projects",
    scope: "/",
    display: "standalone",
    background_color: "#efe9dc",
    theme_color: "#faf7ef",
    icons: [
      { src: "/icons/boardwake-192.png", sizes: "192x192", type: "image/png" },
      { src: "/icons/boardwake-512.png", sizes: "512x512", type: "image/png" },
      { src: "/icons/boardwake-maskable-512.png", sizes: "512x512", type: "image/png", purpose: "maskable" },
    ],
  };
}
