import { createTable, getCoreRowModel, getSortedRowModel, type SortingState } from "@tanstack/react-table";
import { useMemo } from "react";
import type { Column, Sort } from "./column.ts";

/** The rows in the order asked for; rows without a value stay last, equal rows keep their order. */
export function useSortedRows<Row>(rows: Row[], columns: Column<Row>[], sort: Sort | null): Row[] {
  return useMemo(() => {
    const sorting: SortingState = sort ? [sort] : [];
    const table = createTable<Row>({
      data: rows,
      columns: columns.map(({ id, sortValue }) => ({
        id,
        accessorFn: (row: Row) => sortValue?.(row) ?? undefined,
        sortUndefined: "last" as const,
        sortingFn: (a, b, columnId) => compare(a.getValue(columnId), b.getValue(columnId)),
      })),
      state: { sorting },
      onStateChange: () => undefined,
      renderFallbackValue: null,
      getCoreRowModel: getCoreRowModel(),
      getSortedRowModel: getSortedRowModel(),
    });
    return table.getSortedRowModel().rows.map((row) => row.original);
  }, [rows, columns, sort]);
}

const inWords = new Intl.Collator("en", { numeric: true, sensitivity: "base" });

function compare(a: unknown, b: unknown): number {
  if (typeof a === "number" && typeof b === "number") return a - b;
  return inWords.compare(String(a), String(b));
}
