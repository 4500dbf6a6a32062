import { useState, type ReactNode } from "react";
import ArrowDown from "lucide-react/icons/arrow-down";
import ArrowUp from "lucide-react/icons/arrow-up";
import ChevronsUpDown from "lucide-react/icons/chevrons-up-down";
import { classes } from "./classes.ts";
import type { Column, Sort } from "./column.ts";
import { useSortedRows } from "./useSortedRows.ts";

type Props<Row> = {
  /** What the table holds, read aloud as its caption. */
  label: string;
  columns: Column<Row>[];
  rows: Row[];
  rowKey: (row: Row) => string | number;
  /** Shown instead when there are no rows: an EmptyState. */
  empty: ReactNode;
  /** The order to begin with; or, with onSort, the order in force (kept in the URL by the page). */
  sort?: Sort | null | undefined;
  onSort?: ((sort: Sort) => void) | undefined;
  /** For wide tables: scrolls sideways inside its own box between 700 px and its full width. */
  scroll?: boolean | undefined;
};

/** A table with a sticky head and sortable columns; below 700 px each row is a card. */
export function DataTable<Row>(props: Props<Row>) {
  const { label, columns, rows, rowKey, empty, sort: given = null, onSort, scroll } = props;
  const [own, setOwn] = useState(given);
  const sort = onSort ? given : own;
  const sorted = useSortedRows(rows, columns, sort);
  if (rows.length === 0) return <>{empty}</>;
  const sortBy = (id: string) => (onSort ?? setOwn)({ id, desc: sort?.id === id && !sort.desc });
  const hasTotals = columns.some((column) => column.total !== undefined);
  const table = (
    // Roles are spoken out because a table shown as cards loses its own in some browsers.
    <table role="table" className="w-full border-collapse max-table:block">
      <caption className="sr-only">{label}</caption>
      <thead role="rowgroup" className="max-table:mt-3 max-table:block">
        <tr role="row" className="max-table:mb-2.5 max-table:flex max-table:flex-wrap max-table:gap-2">
          {columns.map((column) => (
            <HeadCell key={column.id} column={column} sort={sort} onSort={sortBy} />
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="max-table:grid max-table:gap-2.5">
        {sorted.map((row) => (
          <BodyRow key={rowKey(row)} row={row} columns={columns} />
        ))}
      </tbody>
      {hasTotals && <TotalRow columns={columns} />}
    </table>
  );
  if (!scroll) return table;
  return (
    <div role="region" aria-label={label} tabIndex={0} className="table:overflow-auto print:overflow-visible">
      {table}
    </div>
  );
}

const cellPad = "table:px-2.5 table:py-2";
const asCardLine = "max-table:flex max-table:justify-between max-table:gap-4 max-table:py-1";

type HeadProps<Row> = { column: Column<Row>; sort: Sort | null; onSort: (id: string) => void };

function HeadCell<Row>({ column: { id, head, sortValue, numeric, hideHead }, sort, onSort }: HeadProps<Row>) {
  const direction = sort?.id !== id ? undefined : sort.desc ? "descending" : "ascending";
  const Arrow = direction === "ascending" ? ArrowUp : direction === "descending" ? ArrowDown : ChevronsUpDown;
  return (
    <th
      role="columnheader"
      scope="col"
      aria-sort={sortValue ? (direction ?? "none") : undefined}
      className={classes(
        "text-small text-ink-2 table:sticky table:top-0 table:z-10 table:border-b-2 table:border-ink table:bg-float table:px-2.5 table:py-0 print:static",
        numeric ? "text-right" : "text-left",
        !sortValue && "max-table:sr-only",
      )}
    >
      {sortValue ? (
        <button
          type="button"
          onClick={() => onSort(id)}
          className={classes(
            "inline-flex min-h-touch items-center gap-1 font-semibold hover:text-ink max-table:rounded-full max-table:border-2 max-table:border-line max-table:px-3.5",
            // The figures stay in line under the word, so its arrow goes before it.
            numeric && "table:flex-row-reverse",
          )}
        >
          {head}
          <Arrow aria-hidden="true" className={classes("size-4 print:hidden", !direction && "opacity-60")} />
        </button>
      ) : (
        <span className={hideHead ? "sr-only" : undefined}>{head}</span>
      )}
    </th>
  );
}

function BodyRow<Row>({ row, columns }: { row: Row; columns: Column<Row>[] }) {
  return (
    <tr
      role="row"
      className="sheet-row border-line max-table:block max-table:rounded-card max-table:border-2 max-table:p-3.5 table:border-b"
    >
      {columns.map(({ id, head, cell, numeric, hideHead }, index) => {
        if (index === 0) {
          return (
            <th
              key={id}
              role="rowheader"
              scope="row"
              className={classes("text-left max-table:block max-table:pb-1.5 table:font-normal", cellPad)}
            >
              {cell(row)}
            </th>
          );
        }
        return (
          <td key={id} role="cell" className={classes(asCardLine, cellPad, numeric && "num table:text-right")}>
            {!hideHead && (
              <span aria-hidden="true" className="text-ink-2 table:hidden">
                {head}
              </span>
            )}
            <span className={classes("min-w-0", hideHead && "max-table:grow")}>{cell(row)}</span>
          </td>
        );
      })}
    </tr>
  );
}

function TotalRow<Row>({ columns }: { columns: Column<Row>[] }) {
  return (
    <tfoot role="rowgroup" className="max-table:block">
      <tr
        role="row"
        className="border-ink font-semibold max-table:mt-2.5 max-table:block max-table:border-t-2 max-table:px-3.5 max-table:pt-2 table:border-t-2"
      >
        {columns.map(({ id, head, total, numeric }, index) => (
          <td
            key={id}
            role="cell"
            className={classes(
              asCardLine,
              cellPad,
              numeric && "num table:text-right",
              total === undefined && "max-table:hidden",
            )}
          >
            {index > 0 && (
              <span aria-hidden="true" className="text-ink-2 table:hidden">
                {head}
              </span>
            )}
            <span>{total}</span>
          </td>
        ))}
      </tr>
    </tfoot>
  );
}
