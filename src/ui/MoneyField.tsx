import { useState } from "react";
import { useController } from "react-hook-form";
import { parseMoney } from "../../shared/domain/money.ts";
import type { FieldProps } from "./Field.tsx";
import { useMoneyFormat } from "./Money.tsx";
import { minorToText } from "./moneyText.ts";
import { TextField } from "./TextField.tsx";

type Props = FieldProps & {
  valueMinor: number | null;
  onValueMinor: (amountMinor: number | null) => void;
  onBlur?: (() => void) | undefined;
};

/** An amount typed as text and handed on as whole minor units; null while it is empty or no amount. */
export function MoneyField({ valueMinor, onValueMinor, onBlur, ...field }: Props) {
  const { currency, digits, locale } = useMoneyFormat();
  const [typed, setTyped] = useState<string | null>(null);
  const sign = new Intl.NumberFormat(locale, { style: "currency", currency })
    .formatToParts(0)
    .find((part) => part.type === "currency")?.value;
  const settled = valueMinor === null ? "" : minorToText(valueMinor, digits);
  const shown = typed !== null && parseMoney(typed, digits) === valueMinor ? typed : settled;
  return (
    <TextField
      {...field}
      before={sign}
      inputMode="decimal"
      autoComplete="off"
      inputClassName="num"
      value={shown}
      onChange={(event) => {
        setTyped(event.target.value);
        onValueMinor(parseMoney(event.target.value, digits));
      }}
      onBlur={() => {
        if (valueMinor !== null) setTyped(null);
        onBlur?.();
      }}
    />
  );
}

/** The same inside a Form: the value of `name` is whole minor units or null. */
export function FormMoneyField(props: FieldProps) {
  const { field } = useController<Record<string, number | null>>({ name: props.name });
  return <MoneyField {...props} valueMinor={field.value ?? null} onValueMinor={field.onChange} onBlur={field.onBlur} />;
}
