import type { Rows } from '../row';

export const systemRows: Rows = {
  'GET /api/health': { needs: 'public' },
  'GET /api/dev/mail': { needs: 'public', query: '?to=nobody@team.example' },
};
