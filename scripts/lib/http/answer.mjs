import { ServerResponse } from 'node:http';
import { constants, createBrotliCompress, createGzip } from 'node:zlib';
import { errorAnswer } from './error-page.mjs';

const always = {
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  'Referrer-Policy': 'same-origin',
  'Permissions-Policy':
    'accelerometer=(), camera=(), display-capture=(), geolocation=(), gyroscope=(), microphone=(), midi=(), payment=(), usb=()',
  'Cross-Origin-Opener-Policy': 'same-origin',
  'Cross-Origin-Resource-Policy': 'same-origin',
};

const framing = "frame-ancestors 'none'; base-uri 'self'; form-action 'self'";

/** Below this many bytes, compression costs more than it saves. */
const worthCompressing = 1024;

const compressible =
  /^(?:text\/|image\/svg\+xml|application\/(?:json|javascript|xml|manifest\+json)|[^;]+\+(?:json|xml))/;

/** @param {string} accepted the request's Accept-Encoding */
const chooseEncoding = (accepted) => {
  const offered = accepted
    .toLowerCase()
    .split(',')
    .map((part) => part.trim())
    .filter((part) => !/;\s*q=0(?:\.0*)?$/.test(part))
    .map((part) => part.split(';')[0]?.trim());
  return /** @type {const} */ (['br', 'gzip']).find((name) => offered.includes(name));
};

/** @param {'br' | 'gzip'} encoding */
const createCompressor = (encoding) =>
  encoding === 'br'
    ? createBrotliCompress({ params: { [constants.BROTLI_PARAM_QUALITY]: 4 } })
    : createGzip({ level: 6 });

/**
 * An answer that sees to itself: whatever the application writes, it leaves with the security headers, compressed where that pays, and
 * an error without a body gets a page. Nothing is sent before the first part of the body is known.
 */
export class Answer extends ServerResponse {
  /** @type {import('node:zlib').BrotliCompress | import('node:zlib').Gzip | undefined} */
  #compressor;
  #begun = false;
  /** HTTPS only, for browsers that have been here once. */
  isSecure = false;

  /** @override @param {...unknown} args status, then words and headers in Node's several forms */
  writeHead(...args) {
    const [status, ...rest] = args;
    this.statusCode = Number(status);
    for (const one of rest) {
      if (typeof one === 'string') this.statusMessage = one;
      else if (Array.isArray(one)) this.#setFlat(one);
      else if (typeof one === 'object' && one !== null) {
        for (const [name, value] of Object.entries(one)) if (value !== undefined) this.setHeader(name, value);
      }
    }
    return this;
  }

  /** @param {unknown[]} flat names and values in turn */
  #setFlat(flat) {
    for (let at = 0; at + 1 < flat.length; at += 2) this.setHeader(String(flat[at]), String(flat[at + 1]));
  }

  /** @override */
  flushHeaders() {}

  /** @param {number | undefined} wholeSize of the body in bytes, where it is known */
  #begin(wholeSize) {
    this.#begun = true;
    this.#setSecurityHeaders();
    const type = String(this.getHeader('Content-Type') ?? '');
    if (/^(?:text\/html|application\/json)/.test(type) || !this.hasHeader('Cache-Control')) {
      this.setHeader('Cache-Control', 'no-store');
    }
    const isBare = this.req.method === 'HEAD' || [204, 206, 304].includes(this.statusCode);
    if (!isBare) this.#startCompressor(type, wholeSize);
    if (!isBare && wholeSize !== undefined && this.#compressor === undefined) {
      this.setHeader('Content-Length', wholeSize);
    }
    super.writeHead(this.statusCode);
  }

  #setSecurityHeaders() {
    for (const [name, value] of Object.entries(always)) this.setHeader(name, value);
    if (this.isSecure) this.setHeader('Strict-Transport-Security', 'max-age=31536000; includeSubDomains');
    const policy = this.getHeader('Content-Security-Policy');
    this.setHeader('Content-Security-Policy', policy === undefined ? framing : `${policy}, ${framing}`);
  }

  /** @param {string} type @param {number | undefined} wholeSize */
  #startCompressor(type, wholeSize) {
    if (!compressible.test(type)) return;
    this.appendHeader('Vary', 'Accept-Encoding');
    const announced = this.getHeader('Content-Length');
    const size = wholeSize ?? (announced === undefined ? undefined : Number(announced));
    if (this.hasHeader('Content-Encoding') || (size !== undefined && size < worthCompressing)) return;
    const encoding = chooseEncoding(String(this.req.headers['accept-encoding'] ?? ''));
    if (encoding === undefined) return;

    this.setHeader('Content-Encoding', encoding);
    this.removeHeader('Content-Length');
    this.removeHeader('Accept-Ranges');
    const tag = this.getHeader('ETag');
    if (typeof tag === 'string' && !tag.startsWith('W/')) this.setHeader('ETag', `W/${tag}`);

    const compressor = createCompressor(encoding);
    this.#compressor = compressor;
    compressor.on('data', (part) => {
      if (super.write(part)) return;
      compressor.pause();
      super.once('drain', () => compressor.resume());
    });
    compressor.on('drain', () => this.emit('drain'));
    compressor.once('end', () => super.end());
    this.once('close', () => compressor.destroy());
  }

  /** @override @param {...unknown} args part, encoding and callback in Node's several forms */
  write(...args) {
    const { part, encoding, done } = readArguments(args);
    if (part === undefined) return true;
    if (!this.#begun) this.#begin(undefined);
    return this.#compressor === undefined
      ? super.write(part, encoding, done)
      : this.#compressor.write(part, encoding, done);
  }

  /** @override @param {...unknown} args last part, encoding and callback in Node's several forms */
  end(...args) {
    const { part, encoding, done } = readArguments(args);
    if (this.writableEnded) return this;
    if (!this.#begun) {
      if (part === undefined && this.statusCode >= 400 && !this.hasHeader('Content-Type')) {
        this.sendError(this.statusCode);
        return this;
      }
      this.#begin(part === undefined ? 0 : Buffer.byteLength(part));
    }
    if (done !== undefined) this.once('finish', done);
    const target = this.#compressor;
    if (target === undefined) {
      if (part === undefined) super.end();
      else super.end(part, encoding);
    } else if (part === undefined) target.end();
    else target.end(part, encoding);
    return this;
  }

  /**
   * @param {number} status
   * @param {string} [message] for people, in place of the usual words
   */
  sendError(status, message) {
    if (this.#begun) {
      this.destroy();
      return;
    }
    const { url = '', headers } = this.req;
    const asJson = url.startsWith('/api/') || /^application\/json/.test(String(headers.accept ?? ''));
    const { type, policy, body } = errorAnswer(status, asJson, message);
    this.statusCode = status;
    for (const name of ['Content-Length', 'Content-Encoding', 'ETag', 'Cache-Control'])
      this.removeHeader(name);
    this.setHeader('Content-Type', type);
    this.setHeader('Content-Security-Policy', policy);
    this.setHeader('Content-Length', Buffer.byteLength(body));
    this.end(body);
  }
}

/**
 * @param {unknown[]} args
 * @returns {{ part: string | Uint8Array | undefined, encoding: BufferEncoding, done: (() => void) | undefined }}
 */
const readArguments = (args) => {
  const [part, encoding] = args;
  const done = args.find((one) => typeof one === 'function');
  return {
    part: typeof part === 'string' || part instanceof Uint8Array ? part : undefined,
    encoding: typeof encoding === 'string' && Buffer.isEncoding(encoding) ? encoding : 'utf8',
    done: done === undefined ? undefined : () => done(),
  };
};
