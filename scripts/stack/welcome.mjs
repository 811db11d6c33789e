import { demoSignIns } from './market.mjs';

/** What a person reads once everything runs: the address, the helpers' pages, who can sign in. */
export function welcome({ stack, dir, took, wishedPort }) {
  const { web, payments, mail } = stack.addresses;
  const moved = stack.ports.web === wishedPort ? '' : `  (port ${wishedPort} was taken)`;
  const signIns = demoSignIns(dir);
  const lines = [
    '',
    `Lydite is ready after ${took}:  ${web}/${moved}`,
    '',
    `  Lots to buy           ${web}/`,
    `  Selling               ${web}/sell/`,
    `  Desk                  ${web}/desk/`,
    `  Mails sent            ${mail}/`,
    `  Payment processor     ${payments}/  (local stand-in)`,
    '',
    ...signInTable(signIns),
    'Ctrl-C stops everything; the data stay. "npm start -- --fresh" begins anew.',
  ];
  return lines.join('\n');
}

function signInTable(signIns) {
  if (signIns.length === 0) return [];
  const columns = ['role', 'email', 'password'];
  const widths = columns.map((column) => Math.max(...signIns.map((row) => String(row[column] ?? '').length)));
  const rows = signIns.map((row) =>
    columns.map((column, i) => String(row[column] ?? '').padEnd(widths[i])).join('   '),
  );
  return ['Demo sign-ins:', ...rows.map((row) => `  ${row.trimEnd()}`), ''];
}
