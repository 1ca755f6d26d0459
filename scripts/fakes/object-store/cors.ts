/** Browsers upload from the app's own address, which is another origin. */
export const corsHeaders = {
  "access-control-allow-origin": "*",
  "access-control-allow-methods": "PUT, HEAD, OPTIONS",
  "access-control-allow-headers": "range, x-uploadthing-version, b3, traceparent, content-type",
  "access-control-expose-headers": "x-ut-range-start",
  "access-control-max-age": "600",
};
