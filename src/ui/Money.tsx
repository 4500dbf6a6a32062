import { createContext, useContext, type ReactNode } from "react";
import { formatMoney, type MoneyFormat } from "../../shared/domain/money.ts";

const Format = createContext<MoneyFormat>({ currency: "USD", digits: 2, locale: "en-US" });

/** Sets the currency for every Money and MoneyField below. */
export function MoneyFormatProvider({ format, children }: { format: MoneyFormat; children: ReactNode }) {
  return <Format value={format}>{children}</Format>;
}

/** The format in force here. */
export function useMoneyFormat(): MoneyFormat {
  return useContext(Format);
}

/** An amount of minor units, in tabular figures. */
export function Money({ minor, className = "" }: { minor: number; className?: string | undefined }) {
  return <span className={`num whitespace-nowrap ${className}`}>{formatMoney(minor, useMoneyFormat())}</span>;
}
