import { customType, datetime } from "drizzle-orm/mysql-core";

/** Ids that appear in addresses: 16 characters of Crockford's base 32, compared byte for byte. */
export const publicId = customType<{ data: string; driverData: string }>({
  dataType: () => "varchar(16) CHARACTER SET ascii COLLATE ascii_bin",
});

/** A SHA-256 in hexadecimal. */
export const hash = customType<{ data: string; driverData: string }>({
  dataType: () => "char(64) CHARACTER SET ascii COLLATE ascii_bin",
});

/** A short code from the carton core (a construction, a board, a version), compared byte for byte. */
export const code = customType<{ data: string; driverData: string }>({
  dataType: () => "varchar(64) CHARACTER SET ascii COLLATE ascii_bin",
});

/** A moment in UTC, to the millisecond. */
export const moment = (name: string) => datetime(name, { mode: "date", fsp: 3 });

/** A moment that is now when a row is made. The clock is the application's, so that any database server will do. */
export const momentOfMaking = (name: string) => moment(name).notNull().$defaultFn(() => new Date());
