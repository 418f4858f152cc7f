import fs from 'node:fs';
import http from 'node:http';
import path from 'node:path';

const TYPES = { '.html': 'text/html', '.js': 'text/javascript', '.css': 'text/css', '.svg': 'image/svg+xml' };

/** Serves a built application on loopback, every unknown address as its start page; no API answers. */
export async function serveBuild(folder) {
  const server = http.createServer((request, response) => {
    const { pathname } = new URL(request.url, 'http://x');
    if (pathname.startsWith('/api/')) return response.writeHead(503).end();
    const asked = path.join(folder, path.normalize(pathname));
    const file =
      fs.existsSync(asked) && fs.statSync(asked).isFile() ? asked : path.join(folder, 'index.html');
    response.writeHead(200, { 'content-type': TYPES[path.extname(file)] ?? 'application/octet-stream' });
    fs.createReadStream(file).pipe(response);
  });
  await new Promise((resolve) => server.listen(0, '127.0.0.1', resolve));
  return { address: `http://127.0.0.1:${server.address().port}`, close: () => server.close() };
}
