/** Forms on the contracts' schemas. An entry of its own, for pages that load late: it brings zod along. */
export { useRequestForm, type RequestForm } from './use-request-form.ts';
