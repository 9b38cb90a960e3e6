import type { ReactNode } from 'react';
import { ScrollBox } from './scroll-box.tsx';

export interface Column<Row> {
  key: string;
  head: string;
  /** Numbers stand to the right, in figures of one width. */
  number?: boolean;
  /** Left out on phones, where another cell says it. */
  wideOnly?: boolean;
  cell: (row: Row) => ReactNode;
}

/** A table with a caption and real headers; on a narrow screen it scrolls inside its own frame. */
export function DataTable<Row>(props: {
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  captionShown?: boolean;
}) {
  const { caption, columns, rows, rowKey, captionShown = false } = props;
  return (
    <ScrollBox label={caption}>
      <table className="w-full border-collapse">
        <caption className={captionShown ? 'mb-2 text-left font-serif text-lg font-semibold' : 'sr-only'}>
          {caption}
        </caption>
        <thead>
          <tr>
            {columns.map(({ key, head, number, wideOnly }) => (
              <th
                key={key}
                scope="col"
                className={`border-b border-rule px-2 py-2 text-sm font-semibold text-ink-soft ${number ? 'text-right' : 'text-left'} ${wideOnly ? 'hidden wide:table-cell' : ''}`}
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)}>
              {columns.map(({ key, number, wideOnly, cell }, index) => {
                const look = `border-b border-rule px-2 py-2 align-top ${number ? 'text-right whitespace-nowrap tabular-nums' : 'text-left'} ${wideOnly ? 'hidden wide:table-cell' : ''}`;
                return index === 0 ? (
                  <th key={key} scope="row" className={`${look} font-semibold`}>
                    {cell(row)}
                  </th>
                ) : (
                  <td key={key} className={look}>
                    {cell(row)}
                  </td>
                );
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </ScrollBox>
  );
}
