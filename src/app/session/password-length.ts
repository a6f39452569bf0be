/** Least number of characters of a password; shared/contracts/primitives.ts enforces the same on the server. */
export const PASSWORD_LENGTH = 12;
