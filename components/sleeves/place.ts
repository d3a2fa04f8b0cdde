/** Where she is in a mark-out: which step, one at a time or all on one page. Kept under "marks:<sleeve id>". */
export interface Place {
  at: number;
  all: boolean;
}
