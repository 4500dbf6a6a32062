import type { ReactNode } from "react";

/** One column. The first one names the row and becomes the title of its card on a phone. */
export type Column<Row> = {
  id: string;
  head: string;
  cell: (row: Row) => ReactNode;
  /** Makes the column sortable. */
  sortValue?: ((row: Row) => string | number | null) | undefined;
  /** Right-aligned tabular figures. */
  numeric?: boolean | undefined;
  /** Shown under the column, for totals. */
  total?: ReactNode;
  /** Keeps the head for screen readers only: for columns of buttons. */
  hideHead?: boolean | undefined;
};

/** The column a table is ordered by. */
export type Sort = { id: string; desc: boolean };
