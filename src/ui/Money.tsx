import { createContext, useContext, type ReactNode } from "react";

/** How amounts are written: an ISO 4217 code, its number of minor digits, and a locale. */
export type MoneyFormat = { currency: string; digits: number; locale: string };

const Format = createContext<MoneyFormat>({ currency: "USD", digits: 2, locale: "en-US" });

/** Sets the currency for every Money and MoneyField below. */
export function MoneyFormatProvider({ format, children }: { format: MoneyFormat; children: ReactNode }) {
  return <Format value={format}>{children}</Format>;
}

/** The format in force here. */
export function useMoneyFormat(): MoneyFormat {
  return useContext(Format);
}

/** Writes an amount of minor units in words for people ("$4.00"). */
export function formatMoney(amountMinor: number, { currency, digits, locale }: MoneyFormat): string {
  return new Intl.NumberFormat(locale, {
    style: "currency",
    currency,
    minimumFractionDigits: digits,
    maximumFractionDigits: digits,
  }).format(amountMinor / 10 ** digits);
}

/** An amount of minor units, in tabular figures. */
export function Money({ minor, className = "" }: { minor: number; className?: string | undefined }) {
  return <span className={`num whitespace-nowrap ${className}`}>{formatMoney(minor, useMoneyFormat())}</span>;
}
