import fs from 'node:fs';
import http from 'node:http';
import path from 'node:path';

const TYPES = {
  '.html': 'text/html; charset=utf-8',
  '.js': 'text/javascript',
  '.css': 'text/css',
  '.svg': 'image/svg+xml',
  '.json': 'application/json',
  '.webmanifest': 'application/manifest+json',
};

/** Serves a built page on loopback; unknown addresses get its start page, and no API answers. */
export async function serveFolder(folder) {
  const server = http.createServer((request, response) => {
    const { pathname } = new URL(request.url, 'http://x');
    if (pathname.startsWith('/api/')) return response.writeHead(503).end();
    const asked = path.join(folder, path.normalize(pathname));
    const isFile = fs.existsSync(asked) && fs.statSync(asked).isFile();
    const file = isFile ? asked : path.join(folder, 'index.html');
    response.writeHead(200, { 'content-type': TYPES[path.extname(file)] ?? 'application/octet-stream' });
    fs.createReadStream(file).pipe(response);
  });
  await new Promise((resolve) => server.listen(0, '127.0.0.1', resolve));
  const close = async () => {
    server.closeAllConnections();
    server.close();
  };
  return { address: `http://127.0.0.1:${server.address().port}`, close };
}
