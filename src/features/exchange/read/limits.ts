/** What one file may hold. Past these it is refused, with how to make it fit. */
export const MOST_BYTES = 50 * 1024 * 1024;
/** Of an archive once it is open, and how many times its own size that may be once past the first megabyte. */
export const MOST_UNPACKED_BYTES = 100 * 1024 * 1024;
export const MOST_UNPACK_RATIO = 200;
export const FREE_BYTES = 1024 * 1024;
export const MOST_ENTRIES = 1000;
/** Elements of GPX or KML; heights and times of track points are not counted. */
export const MOST_ELEMENTS = 250_000;
export const MOST_THINGS = 5000;
export const MOST_PLACES = 200_000;
/** Characters in one line of a table. */
export const LONGEST_LINE = 20_000;
