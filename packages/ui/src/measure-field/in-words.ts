const small = [
  'zero',
  'one',
  'two',
  'three',
  'four',
  'five',
  'six',
  'seven',
  'eight',
  'nine',
  'ten',
  'eleven',
  'twelve',
  'thirteen',
  'fourteen',
  'fifteen',
  'sixteen',
  'seventeen',
  'eighteen',
  'nineteen',
];
const tens = ['', '', 'twenty', 'thirty', 'forty', 'fifty', 'sixty', 'seventy', 'eighty', 'ninety'];

function belowThousand(value: number): string {
  if (value < 20) return small[value] ?? '';
  if (value < 100) return [tens[Math.floor(value / 10)], value % 10 ? small[value % 10] : ''].filter(Boolean).join('-');
  const rest = value % 100;
  return `${small[Math.floor(value / 100)]} hundred${rest ? ` and ${belowThousand(rest)}` : ''}`;
}

/** The size of a figure in words, to two or three digits, so that a misread separator can't go unnoticed: 1234 is "one thousand two hundred". */
export function inWords(value: number): string {
  if (value < 1000) {
    const whole = Math.floor(value);
    const tenth = Math.floor((value - whole) * 10);
    return `${belowThousand(whole)} point ${small[tenth]}`;
  }
  const thousands = Math.floor(value / 1000);
  const hundreds = Math.floor((value % 1000) / 100);
  return `${belowThousand(thousands)} thousand${hundreds ? ` ${small[hundreds]} hundred` : ''}`;
}
