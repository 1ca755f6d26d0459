/** How files say that a point belongs to no net. */
export const isNoNet = (name: string): boolean => name === "" || name === "N/C" || name === "n/c";
