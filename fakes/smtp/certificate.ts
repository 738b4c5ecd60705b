import { generateKeyPairSync, randomBytes, sign } from 'node:crypto';

/*
 * A certificate for STARTTLS, made anew at each start with Node's own crypto, so that no private
 * key lies in the repository. The bytes are DER (ITU-T X.690) in the shape of RFC 5280, section 4.1.
 */

const tags = {
  integer: 0x02,
  bitString: 0x03,
  octetString: 0x04,
  objectId: 0x06,
  utf8String: 0x0c,
  sequence: 0x30,
  set: 0x31,
  generalizedTime: 0x18,
  version: 0xa0,
  extensions: 0xa3,
  dnsName: 0x82,
  ipAddress: 0x87,
} as const;

const objectIds = {
  ecdsaWithSha256: Buffer.from('2a8648ce3d040302', 'hex'),
  commonName: Buffer.from('550403', 'hex'),
  subjectAltName: Buffer.from('551d11', 'hex'),
} as const;

function lengthOf(size: number): Buffer {
  if (size < 0x80) return Buffer.from([size]);
  const bytes = Buffer.from(size.toString(16).padStart(size > 0xff ? 4 : 2, '0'), 'hex');
  return Buffer.concat([Buffer.from([0x80 | bytes.length]), bytes]);
}

function der(tag: keyof typeof tags, ...contents: Buffer[]): Buffer {
  const content = Buffer.concat(contents);
  return Buffer.concat([Buffer.from([tags[tag]]), lengthOf(content.length), content]);
}

function time(at: number): Buffer {
  const digits = new Date(at).toISOString().replace(/\D/g, '').slice(0, 14);
  return der('generalizedTime', Buffer.from(`${digits}Z`));
}

function name(commonName: string): Buffer {
  const value = der('utf8String', Buffer.from(commonName));
  const attribute = der('sequence', der('objectId', objectIds.commonName), value);
  return der('sequence', der('set', attribute));
}

const dayMs = 24 * 60 * 60 * 1000;

/**
 * A self-signed certificate for `localhost` and 127.0.0.1 with its key, both as PEM. It is valid
 * from a day ago for thirty days by this computer's clock, which is the one TLS goes by.
 */
export function createCertificate(): { certificate: string; key: string } {
  const { privateKey, publicKey } = generateKeyPairSync('ec', {
    namedCurve: 'P-256',
  });
  const algorithm = der('sequence', der('objectId', objectIds.ecdsaWithSha256));
  // Positive and not zero, as RFC 5280, 4.1.2.2 asks of a serial number.
  const serial = Buffer.concat([Buffer.from([0x01]), randomBytes(15)]);
  const alternatives = der(
    'sequence',
    der('dnsName', Buffer.from('localhost')),
    der('ipAddress', Buffer.from([127, 0, 0, 1])),
  );
  const unsigned = der(
    'sequence',
    der('version', der('integer', Buffer.from([2]))),
    der('integer', serial),
    algorithm,
    name('localhost'),
    der('sequence', time(Date.now() - dayMs), time(Date.now() + 30 * dayMs)),
    name('localhost'),
    publicKey.export({ type: 'spki', format: 'der' }),
    der(
      'extensions',
      der(
        'sequence',
        der(
          'sequence',
          der('objectId', objectIds.subjectAltName),
          der('octetString', alternatives),
        ),
      ),
    ),
  );
  const signature = sign('sha256', unsigned, privateKey);
  const signed = der(
    'sequence',
    unsigned,
    algorithm,
    der('bitString', Buffer.from([0]), signature),
  );
  const lines = signed.toString('base64').replace(/.{1,64}/g, '$&\n');
  return {
    certificate: `-----BEGIN CERTIFICATE-----\n${lines}-----END CERTIFICATE-----\n`,
    key: privateKey.export({ type: 'pkcs8', format: 'pem' }).toString(),
  };
}
