import { readEnv } from '../../env';

/** Hour, UTC, at which this installation sends its daily mail. */
export const digestHour = (): number => readEnv().DIGEST_HOUR;
