/** Milliseconds of a clock that all processes of this machine share; only differences mean anything. */
export const sharedMs = (): number => Number(process.hrtime.bigint()) / 1e6;
