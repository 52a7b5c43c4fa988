/** Height of a row of the schedule, px. */
export const ROW_DEEP = 22;
