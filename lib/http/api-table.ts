import "server-only";
import type { Operation } from "./operation";
import { ACCOUNT_OPERATIONS } from "./operations-account";
import { GOODS_IN_OPERATIONS } from "./operations-goods-in";
import { OFFICE_OPERATIONS } from "./operations-office";
import { RACK_OPERATIONS } from "./operations-rack";

/** Every operation of the API, from which its description is made; a test holds it equal to the routes there are. */
export const OPERATIONS: readonly Operation[] = [
  ...ACCOUNT_OPERATIONS,
  ...RACK_OPERATIONS,
  ...GOODS_IN_OPERATIONS,
  ...OFFICE_OPERATIONS,
];
