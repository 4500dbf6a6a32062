// @vitest-environment jsdom
import { cleanup, render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { useForm } from "react-hook-form";
import { afterEach, expect, test, vi } from "vitest";
import { CheckField } from "../../src/ui/CheckField.tsx";
import { Form } from "../../src/ui/Form.tsx";
import type { FormProblem } from "../../src/ui/formContext.ts";
import { FormMoneyField } from "../../src/ui/MoneyField.tsx";
import { parseMoney } from "../../shared/domain/money.ts";
import { minorToText } from "../../src/ui/moneyText.ts";
import { RadioGroup } from "../../src/ui/RadioGroup.tsx";
import { TextField } from "../../src/ui/TextField.tsx";

afterEach(cleanup);

type Order = { name: string; phone: string; price: number | null; missing: string; other: boolean };
type Props = { onSubmit?: (order: Order) => void; problem?: FormProblem | null };

function OrderForm({ onSubmit = () => undefined, problem = null }: Props) {
  const form = useForm<Order>({ defaultValues: { name: "", phone: "", price: 350, missing: "similar", other: false } });
  return (
    <Form form={form} onSubmit={onSubmit} problem={problem}>
      <TextField label="Name" hint="As we call it out" {...form.register("name", { required: "Enter your name." })} />
      <TextField
        label="Phone"
        optional
        {...form.register("phone", { maxLength: { value: 5, message: "Too long." } })}
      />
      <FormMoneyField label="Price" name="price" />
      <RadioGroup
        label="If something is missing"
        {...form.register("missing")}
        options={[
          { value: "similar", label: "Something similar" },
          { value: "credit", label: "Credit" },
        ]}
      />
      <CheckField label="Someone else collects" {...form.register("other")} />
      <button type="submit">Place the order</button>
    </Form>
  );
}

test("a field is named by its label and described by its hint", () => {
  render(<OrderForm />);
  const name = screen.getByRole("textbox", { name: "Name" });
  expect(name).toHaveProperty("name", "name");
  expect(describedBy(name)).toBe("As we call it out");
  expect(name.getAttribute("aria-invalid")).toBeNull();
});

test("what is wrong is listed on top and said by the field, and focus goes to the first of it", async () => {
  const user = userEvent.setup();
  const onSubmit = vi.fn();
  render(<OrderForm onSubmit={onSubmit} />);
  await user.type(screen.getByRole("textbox", { name: /Phone/ }), "123456");
  await user.click(screen.getByRole("button", { name: "Place the order" }));
  const list = await screen.findByRole("alert");
  expect(list.textContent).toContain("2 things need mending");
  const name = screen.getByRole("textbox", { name: "Name" });
  expect(screen.getByRole("link", { name: "Enter your name." }).getAttribute("href")).toBe(`#${name.id}`);
  expect(name.getAttribute("aria-invalid")).toBe("true");
  expect(describedBy(name)).toContain("Enter your name.");
  expect(document.activeElement).toBe(name);
  expect(screen.getByRole("textbox", { name: /Phone/ })).toHaveProperty("value", "123456");
  expect(onSubmit).not.toHaveBeenCalled();
});

test("a good form hands on what was typed, amounts in minor units", async () => {
  const user = userEvent.setup();
  const onSubmit = vi.fn();
  render(<OrderForm onSubmit={onSubmit} />);
  await user.type(screen.getByRole("textbox", { name: "Name" }), "Ines");
  const price = screen.getByRole("textbox", { name: "Price" });
  expect(price).toHaveProperty("value", "3.50");
  await user.clear(price);
  await user.type(price, "4.2");
  await user.click(screen.getByRole("radio", { name: "Credit" }));
  await user.click(screen.getByRole("checkbox", { name: "Someone else collects" }));
  await user.click(screen.getByRole("button", { name: "Place the order" }));
  await waitFor(() => expect(onSubmit).toHaveBeenCalledOnce());
  expect(onSubmit.mock.calls[0]?.[0]).toEqual({ name: "Ines", phone: "", price: 420, missing: "credit", other: true });
  expect(price).toHaveProperty("value", "4.20");
});

test("what the server refused is shown on top and by its field, and what was typed stays", async () => {
  const user = userEvent.setup();
  function Refused() {
    const [problem, setProblem] = useState<FormProblem | null>(null);
    const errors = [{ field: "name", message: "That name is taken." }];
    return (
      <OrderForm problem={problem} onSubmit={() => setProblem({ title: "Please check the marked fields.", errors })} />
    );
  }
  render(<Refused />);
  await user.type(screen.getByRole("textbox", { name: "Name" }), "Ines");
  await user.click(screen.getByRole("button", { name: "Place the order" }));
  const list = await screen.findByRole("alert");
  expect(list.textContent).toContain("Please check the marked fields.");
  expect(document.activeElement).toBe(list);
  const name = screen.getByRole("textbox", { name: "Name" });
  expect(describedBy(name)).toContain("That name is taken.");
  expect(name).toHaveProperty("value", "Ines");
});

test("amounts are read as people type them, without floating point", () => {
  expect(parseMoney("4.10", 2)).toBe(410);
  expect(parseMoney("$1,234.5", 2)).toBe(123_450);
  expect(parseMoney("3,50", 2)).toBe(350);
  expect(parseMoney(" 12 ", 0)).toBe(12);
  expect(parseMoney("0.07", 2)).toBe(7);
  for (const wrong of ["", "abc", "1.234", "1.2.3", "99999999999999999999"]) expect(parseMoney(wrong, 2)).toBeNull();
  expect(minorToText(5, 2)).toBe("0.05");
  expect(minorToText(-1250, 2)).toBe("-12.50");
  expect(minorToText(1250, 0)).toBe("1250");
});

function describedBy(element: HTMLElement): string {
  const ids = element.getAttribute("aria-describedby")?.split(" ") ?? [];
  return ids.map((id) => document.getElementById(id)?.textContent).join(" ");
}
