import helmet from 'helmet';
import type { Config } from '../config';

/** Styles come in `<style>` elements made by react-native-web, never in attributes; everything else is our own files. */
export const contentSecurityPolicy = {
  'default-src': ["'none'"],
  'script-src': ["'self'"],
  'style-src': ["'self'", "'unsafe-inline'"],
  'style-src-attr': ["'none'"],
  'img-src': ["'self'", 'data:', 'blob:'],
  'font-src': ["'self'"],
  'connect-src': ["'self'"],
  'manifest-src': ["'self'"],
  'worker-src': ["'self'"],
  'base-uri': ["'none'"],
  'form-action': ["'self'"],
  'frame-ancestors': ["'none'"],
};

export const securityHeaders = ({ baseUrl }: Config) =>
  helmet({
    contentSecurityPolicy: { useDefaults: false, directives: contentSecurityPolicy },
    strictTransportSecurity: baseUrl.startsWith('https:'),
    xFrameOptions: { action: 'deny' },
  });
