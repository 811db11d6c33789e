export { EN_DASH, MINUS, NBSP } from './characters.ts';
export { countryName } from './country-name.ts';
export { currencySign, formatAbout, formatMoney } from './format-money.ts';
export {
  formatBreakEvenG,
  formatFineG,
  formatGoldG,
  formatGrade,
  formatMassG,
  formatRange,
  formatShare,
  GRAMS_PER_OZT,
} from './format-mass.ts';
export { formatNumber, formatSignificant, LOCALE } from './format-number.ts';
export { formatDateTime, formatDuration, formatRelative } from './format-time.ts';
export { MoneyText } from './MoneyText.tsx';
