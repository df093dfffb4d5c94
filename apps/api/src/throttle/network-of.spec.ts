import { networkOf } from './network-of';

describe('what counts as one place in the net', () => {
  it('is an IPv4 address, also where it is told as IPv6', () => {
    expect(networkOf('192.0.2.7')).toBe('192.0.2.7');
    expect(networkOf('::ffff:192.0.2.7')).toBe('192.0.2.7');
    expect(networkOf('::FFFF:c000:207')).toBe('192.0.2.7');
  });

  it('is the /64 of an IPv6 address, however it is spelled', () => {
    for (const address of ['2001:db8:0:7::1', '2001:0DB8:0000:0007:ffff::', '2001:db8:0:7:1:2:3:4%eth0'])
      expect(networkOf(address)).toBe('2001:db8:0:7::/64');
    expect(networkOf('2001:db8:0:8::1')).toBe('2001:db8:0:8::/64');
    expect(networkOf('2001:db8::1')).toBe('2001:db8:0:0::/64');
    expect(networkOf('::1')).toBe('0:0:0:0::/64');
  });

  it('is one place for all that is no address', () => {
    expect(networkOf('')).toBe('unknown');
    expect(networkOf('x'.repeat(500))).toBe('unknown');
  });
});
