import type { ReactNode } from "react";

/** One line of a select, combo box or radio group. */
export type Option = {
  id: string;
  label: string;
  description?: string;
  /** Drawn before the label, e.g. a glyph. */
  mark?: ReactNode;
  isDisabled?: boolean;
};
