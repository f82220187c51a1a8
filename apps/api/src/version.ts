/** Version of this installation, as health and OpenAPI state it. */
export const APP_VERSION = '0.1.0';
