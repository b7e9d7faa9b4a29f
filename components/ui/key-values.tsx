import { Fragment, type ReactNode } from "react";

export interface KeyValue {
  label: ReactNode;
  value: ReactNode;
  key?: string;
}

/** Names and figures in two columns under rules. */
export function KeyValues({ items }: { items: readonly KeyValue[] }) {
  return (
    <dl className="key-values">
      {items.map(({ label, value, key }, index) => (
        <Fragment key={key ?? index}>
          <dt>{label}</dt>
          <dd className="num">{value}</dd>
        </Fragment>
      ))}
    </dl>
  );
}
