// Ink head rule, hairline rows, figures to the right. Sorting is a link: its state stands in the address.
import type { ReactNode } from "react";
import { Link, useSearchParams } from "react-router";
import { classNames } from "./class-names";
import { FileLink } from "./button";
import { Icon } from "./icon";

export interface Column<Row> {
  readonly key: string;
  readonly head: string;
  readonly cell: (row: Row) => ReactNode;
  readonly align?: "right";
  /** Named in `?sort=`; absent where the column does not sort. */
  readonly sort?: string;
  /** Goes to a second line under the first column on a narrow screen. */
  readonly least?: boolean;
  readonly className?: string;
}

export interface TableProps<Row> {
  caption: string;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  rowKey: (row: Row) => string;
  /** What is sorted by when the address does not say. */
  sortedBy?: { readonly column: string; readonly direction: "up" | "down" };
  csv?: string;
  /** Said above the table, e.g. "12 cartons". */
  count?: ReactNode;
}

export function Table<Row>({ caption, columns, rows, rowKey, sortedBy, csv, count }: TableProps<Row>) {
  return (
    <div>
      {(count || csv) && (
        <div className="flex items-baseline justify-between gap-4 pb-2 text-small text-ink-2">
          <p>{count}</p>
          {csv && <FileLink href={csv} download aria-label={`${caption} as CSV`}>CSV</FileLink>}
        </div>
      )}
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">{caption}</caption>
        <thead>
          <tr className="border-b-2 border-ink">
            {columns.map((column) => (
              <Head key={column.key} column={column} sortedBy={sortedBy} />
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <tr key={rowKey(row)} className="border-b border-rule align-middle hover:bg-board">
              {columns.map((column, index) => (
                <td
                  key={column.key}
                  className={classNames("py-2.5 pr-4 last:pr-0", column.align === "right" && "text-right", column.least && "max-md:hidden", column.className)}
                >
                  {column.cell(row)}
                  {index === 0 && (
                    <span className="md:hidden">
                      {columns.filter((other) => other.least).map((other) => (
                        <span key={other.key} className="block pt-0.5 text-small text-ink-2">
                          {other.cell(row)}
                        </span>
                      ))}
                    </span>
                  )}
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}

function Head<Row>({ column, sortedBy }: { column: Column<Row>; sortedBy: TableProps<Row>["sortedBy"] }) {
  const [search] = useSearchParams();
  const classes = classNames("py-1.5 pr-4 text-label font-bold text-ink-2 last:pr-0", column.align === "right" && "text-right", column.least && "max-md:hidden");
  if (!column.sort) return <th scope="col" className={classes}>{column.head}</th>;
  const current = search.get("sort") ?? sortedBy?.column;
  const direction = search.get("direction") ?? sortedBy?.direction ?? "up";
  const isCurrent = current === column.sort;
  const next = new URLSearchParams(search);
  next.set("sort", column.sort);
  next.set("direction", isCurrent && direction === "up" ? "down" : "up");
  next.delete("page");
  return (
    <th scope="col" aria-sort={isCurrent ? (direction === "up" ? "ascending" : "descending") : undefined} className={classes}>
      <Link to={{ search: `?${next}` }} preventScrollReset className="inline-flex min-h-6 items-center gap-1 hover:text-live">
        <span className={isCurrent ? "text-ink" : undefined}>{column.head}</span>
        {isCurrent && <Icon name={direction === "up" ? "up" : "down"} size={12} />}
      </Link>
    </th>
  );
}

/** "Page 2 of 7", with links to the ones beside it. Nothing where there is one page. */
export function Pages({ page, pageCount }: { page: number; pageCount: number }) {
  const [search] = useSearchParams();
  if (pageCount < 2) return null;
  const to = (at: number) => {
    const next = new URLSearchParams(search);
    next.set("page", String(at));
    return { search: `?${next}` };
  };
  const link = "inline-flex min-h-6 items-center gap-1 border-b border-rule-2 hover:border-ink hover:text-live max-md:min-h-11";
  return (
    <nav aria-label="Pages" className="flex items-center gap-5 pt-4 text-small">
      {page > 1 && <Link to={to(page - 1)} className={link}><Icon name="left" size={12} />Earlier</Link>}
      <span className="text-ink-2">Page {page} of {pageCount}</span>
      {page < pageCount && <Link to={to(page + 1)} className={link}>Later<Icon name="right" size={12} /></Link>}
    </nav>
  );
}
