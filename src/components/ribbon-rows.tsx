import { type ComponentProps, useMemo } from 'react';
import { Ribbon } from './ribbon.tsx';

/** Most lobes in a row that still leave room for labels and marks on a page. */
const ROW_LOBES = 18;

/** A ribbon that goes on in further rows where a set has many questions, rows as even as can be. */
export function RibbonRows(props: ComponentProps<typeof Ribbon>) {
  const { items, name } = props;
  const rows = useMemo(() => {
    const count = Math.ceil(items.length / ROW_LOBES);
    const length = Math.ceil(items.length / Math.max(1, count));
    return Array.from({ length: count }, (_, row) => ({
      from: row * length + 1,
      items: items.slice(row * length, (row + 1) * length),
    }));
  }, [items]);
  if (rows.length <= 1) return <Ribbon {...props} />;
  return (
    <div className="grid gap-2 w-full">
      {rows.map((row) => (
        <Ribbon
          key={row.from}
          {...props}
          items={row.items}
          {...(name ? { name: `${name}, questions ${row.from} to ${row.from + row.items.length - 1}` } : {})}
        />
      ))}
    </div>
  );
}
