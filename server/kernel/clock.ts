/** The current moment, so that tests may say what time it is. */
export type Clock = () => Date;
export const systemClock: Clock = () => new Date();
