import { describe, expect, it } from 'vitest';
import { withinClient } from './within-client.ts';

describe('a path of the market in one of its clients', () => {
  it.each([
    ['/lots/L-1', '/', '/lots/L-1'],
    ['/sell/deals/D-1', '/', null],
    ['/desk', '/', null],
    ['/sellers', '/', '/sellers'],
    ['/sell/deals/D-1?paid=1', '/sell', '/deals/D-1?paid=1'],
    ['/sell', '/sell', '/'],
    ['/lots/L-1', '/sell', null],
    ['/desk/deals', '/sell', null],
  ])('%s below %s is %s', (path, basename, expected) => {
    expect(withinClient(path, basename)).toBe(expected);
  });
});
