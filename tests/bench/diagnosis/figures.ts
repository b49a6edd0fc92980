export type Figure = {
  readonly figure: string;
  readonly value: number;
  readonly bar: number | null;
  readonly holds: boolean | null;
  /** What it was measured on; printed in the table, not as JSON. */
  readonly on?: string;
};

/** A figure that should not exceed its bar, where it has one. */
export const atMost = (figure: string, value: number, bar: number | null = null, on?: string): Figure => ({
  figure,
  value: rounded(value),
  bar,
  holds: bar === null ? null : value <= bar,
  ...(on === undefined ? {} : { on }),
});

const rounded = (value: number): number => Number(value.toPrecision(4));

/** One table, or a line of JSON a figure. */
export function print(figures: readonly Figure[], json: boolean): void {
  if (json) for (const { figure, value, bar, holds } of figures) console.log(JSON.stringify({ figure, value, bar, holds }));
  else
    console.table(
      Object.fromEntries(
        figures.map(({ figure, value, bar, holds, on }) => [figure, { value, bar: bar ?? "", holds: holds ?? "", on: on ?? "" }]),
      ),
    );
}
