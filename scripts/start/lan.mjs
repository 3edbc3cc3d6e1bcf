/**
 * What a listener at the table needs to know about serving the local network over plain http.
 * @param {string} address
 * @returns {Promise<string>} a QR code and sentences for the console
 */
export async function lanNotice(address) {
  const { default: qrcode } = await import('qrcode')
  const picture = await qrcode.toString(address, { type: 'utf8', errorCorrectionLevel: 'M' })
  return [
    picture,
    `On this network: ${address}`,
    'Everyone on this network can reach it, and what travels is not encrypted: use a network you trust.',
    'Without TLS a phone’s browser refuses some things: there is no service worker, so a page does not open',
    'while the network is away (ratings already typed are kept on the phone and sent later), and “Copy” buttons',
    'show text to select instead. docs/operations.md says how to put TLS in front.',
  ].join('\n')
}
