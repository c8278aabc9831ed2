import { demoAccounts } from '../db/demo/accounts';

/** Prints the demo's accounts, one a line, for the start command. */
const width = Math.max(...demoAccounts.map(({ email }) => email.length));
for (const { email, password, role, show } of demoAccounts) {
  console.log(`    ${role.padEnd(9)} ${email.padEnd(width)}  ${password.padEnd(18)} (${show})`);
}
