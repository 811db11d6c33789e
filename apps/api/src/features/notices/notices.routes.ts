import type { On } from '../../platform/routes.ts';
import type { NoticesService } from './notices.service.ts';

export function noticeRoutes(on: On, notices: NoticesService): void {
  on('GET /my/notices', ({ actor }) => notices.list(actor));
  on('POST /my/notices/read', ({ actor }) => notices.markRead(actor));
}
