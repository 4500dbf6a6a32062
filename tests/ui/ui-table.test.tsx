// @vitest-environment jsdom
import { cleanup, render, screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { afterEach, expect, test, vi } from "vitest";
import type { Column } from "../../src/ui/column.ts";
import { DataTable } from "../../src/ui/DataTable.tsx";

afterEach(cleanup);

type Line = { name: string; ready: number | null };
const lines: Line[] = [
  { name: "Romaine", ready: 96 },
  { name: "Butterhead", ready: 240 },
  { name: "Dill", ready: null },
  { name: "Arugula", ready: 9 },
];
const columns: Column<Line>[] = [
  { id: "name", head: "Variety", cell: (line) => line.name, sortValue: (line) => line.name, total: "Together" },
  {
    id: "ready",
    head: "Ready",
    cell: (line) => line.ready ?? "–",
    sortValue: (line) => line.ready,
    numeric: true,
    total: 345,
  },
  { id: "note", head: "Note", cell: () => "none" },
];
const table = {
  label: "What is ready",
  columns,
  rows: lines,
  rowKey: (line: Line) => line.name,
  empty: <p>Nothing yet</p>,
};
const names = () => screen.getAllByRole("rowheader").map((cell) => cell.textContent);

test("rows stand as given until a head is pressed", () => {
  render(<DataTable {...table} />);
  expect(screen.getByRole("table", { name: "What is ready" })).toBeTruthy();
  expect(names()).toEqual(["Romaine", "Butterhead", "Dill", "Arugula"]);
  expect(screen.getByRole("columnheader", { name: "Ready" }).getAttribute("aria-sort")).toBe("none");
  expect(screen.getByRole("columnheader", { name: "Note" }).getAttribute("aria-sort")).toBeNull();
});

test("pressing a head sorts by number up and then down, and what has no number stays last", async () => {
  const user = userEvent.setup();
  render(<DataTable {...table} />);
  const ready = screen.getByRole("button", { name: "Ready" });
  await user.click(ready);
  expect(names()).toEqual(["Arugula", "Romaine", "Butterhead", "Dill"]);
  expect(screen.getByRole("columnheader", { name: "Ready" }).getAttribute("aria-sort")).toBe("ascending");
  await user.click(ready);
  expect(names()).toEqual(["Butterhead", "Romaine", "Arugula", "Dill"]);
  expect(screen.getByRole("columnheader", { name: "Ready" }).getAttribute("aria-sort")).toBe("descending");
});

test("words sort as words, by keyboard too", async () => {
  const user = userEvent.setup();
  render(<DataTable {...table} />);
  screen.getByRole("button", { name: "Variety" }).focus();
  await user.keyboard("{Enter}");
  expect(names()).toEqual(["Arugula", "Butterhead", "Dill", "Romaine"]);
});

test("a page that keeps the order itself is told, and shows what it is given", async () => {
  const user = userEvent.setup();
  const onSort = vi.fn();
  render(<DataTable {...table} sort={{ id: "name", desc: true }} onSort={onSort} />);
  expect(names()).toEqual(["Romaine", "Dill", "Butterhead", "Arugula"]);
  await user.click(screen.getByRole("button", { name: "Ready" }));
  expect(onSort).toHaveBeenCalledWith({ id: "ready", desc: false });
  expect(names()[0]).toBe("Romaine");
});

test("totals stand below, and an empty table says so instead", () => {
  const { rerender } = render(<DataTable {...table} />);
  const last = screen.getAllByRole("row").at(-1)!;
  expect(within(last).getByText("345")).toBeTruthy();
  rerender(<DataTable {...table} rows={[]} />);
  expect(screen.queryByRole("table")).toBeNull();
  expect(screen.getByText("Nothing yet")).toBeTruthy();
});
