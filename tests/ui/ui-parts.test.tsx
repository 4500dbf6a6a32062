// @vitest-environment jsdom
import { cleanup, render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { renderToString } from "react-dom/server";
import { afterEach, expect, test, vi } from "vitest";
import { Awning } from "../../src/ui/Awning.tsx";
import { Button } from "../../src/ui/Button.tsx";
import { ConfirmDialog } from "../../src/ui/ConfirmDialog.tsx";
import { Money, MoneyFormatProvider } from "../../src/ui/Money.tsx";
import { QrCode } from "../../src/ui/QrCode.tsx";
import { Stepper } from "../../src/ui/Stepper.tsx";
import { ToastProvider, useToast } from "../../src/ui/Toast.tsx";

afterEach(cleanup);

// jsdom knows the element but not how it opens; the browser journeys see the real one.
HTMLDialogElement.prototype.showModal = function () {
  this.open = true;
};
HTMLDialogElement.prototype.close = function () {
  this.open = false;
};

function Counter({
  start = 1,
  max = 4,
  onChange,
}: {
  start?: number;
  max?: number;
  onChange?: (value: number) => void;
}) {
  const [value, setValue] = useState(start);
  const set = (next: number) => {
    setValue(next);
    onChange?.(next);
  };
  return <Stepper label="Butterhead" value={value} onChange={set} max={max} />;
}

test("a stepper counts up to what is left and says so, then no further", async () => {
  const user = userEvent.setup();
  render(<Counter start={3} max={4} />);
  const more = screen.getByRole("button", { name: "One Butterhead more" });
  await user.click(more);
  expect(screen.getByRole("textbox")).toHaveProperty("value", "4");
  expect(screen.getByText("4 Butterhead, no more left")).toBeTruthy();
  expect(more.getAttribute("aria-disabled")).toBe("true");
  await user.click(more);
  expect(screen.getByRole("textbox")).toHaveProperty("value", "4");
});

test("a number typed into a stepper is kept within its limits, and nonsense is dropped", async () => {
  const user = userEvent.setup();
  const onChange = vi.fn();
  render(<Counter onChange={onChange} />);
  const box = screen.getByRole("textbox", { name: "How many Butterhead" });
  await user.clear(box);
  await user.type(box, "99{Enter}");
  expect(onChange).toHaveBeenLastCalledWith(4);
  await user.clear(box);
  await user.type(box, "x");
  await user.tab();
  expect(box).toHaveProperty("value", "4");
  await user.click(box);
  await user.keyboard("0");
  await user.tab();
  expect(onChange).toHaveBeenLastCalledWith(0);
  expect(screen.getByRole("button", { name: "One Butterhead less" }).getAttribute("aria-disabled")).toBe("true");
});

test("a pending button says what goes on and does not act twice", async () => {
  const user = userEvent.setup();
  const onClick = vi.fn();
  const { rerender } = render(<Button onClick={onClick}>Post this week</Button>);
  await user.click(screen.getByRole("button", { name: "Post this week" }));
  rerender(
    <Button onClick={onClick} pending="Posting">
      Post this week
    </Button>,
  );
  await user.click(screen.getByRole("button", { name: "Posting…" }));
  expect(onClick).toHaveBeenCalledOnce();
});

test("a dialog opens on top with its title as its name, and closes by its button", async () => {
  const user = userEvent.setup();
  const onClose = vi.fn();
  const onConfirm = vi.fn();
  const props = { onClose, onConfirm, title: "Cancel this order?", confirmLabel: "Cancel my order" };
  const { rerender } = render(<ConfirmDialog {...props} open={false} />);
  expect(screen.queryByRole("dialog")).toBeNull();
  rerender(<ConfirmDialog {...props} open />);
  expect(screen.getByRole("dialog", { name: "Cancel this order?" })).toHaveProperty("open", true);
  await user.click(screen.getByRole("button", { name: "Cancel my order" }));
  expect(onConfirm).toHaveBeenCalledOnce();
  await user.click(screen.getByRole("button", { name: "Close" }));
  expect(onClose).toHaveBeenCalledOnce();
  rerender(<ConfirmDialog {...props} open={false} />);
  expect(screen.queryByRole("dialog")).toBeNull();
});

test("what was just done is read out and can be undone", async () => {
  const user = userEvent.setup();
  const act = vi.fn();
  function Done() {
    const show = useToast();
    return <Button onClick={() => show("K7M collected", { label: "Undo", act })}>Tick</Button>;
  }
  render(
    <ToastProvider>
      <Done />
    </ToastProvider>,
  );
  await user.click(screen.getByRole("button", { name: "Tick" }));
  expect(screen.getByText("K7M collected").closest("[aria-live]")?.getAttribute("aria-live")).toBe("polite");
  await user.click(screen.getByRole("button", { name: "Undo" }));
  expect(act).toHaveBeenCalledOnce();
  expect(screen.queryByText("K7M collected")).toBeNull();
});

test("money is written in the farm's currency and digits", () => {
  const { container, rerender } = render(<Money minor={400} />);
  expect(container.textContent).toBe("$4.00");
  rerender(
    <MoneyFormatProvider format={{ currency: "JPY", digits: 0, locale: "en-US" }}>
      <Money minor={400} />
    </MoneyFormatProvider>,
  );
  expect(container.textContent).toBe("¥400");
});

test("two awnings on one page do not share a pattern, and nothing needs an inline style", () => {
  const html = renderToString(
    <>
      <Awning pattern="dots" colour="leaf" />
      <Awning pattern="checks" colour="sun" />
      <QrCode text="K7M" label="Pickup code K7M" />
    </>,
  );
  const ids = [...html.matchAll(/<pattern id="([^"]+)"/g)].map(([, id]) => id);
  expect(new Set(ids).size).toBe(4);
  for (const id of ids) expect(html).toContain(`url(#${id})`);
  expect(html).not.toContain("style=");
});
