import { mountApp } from '@lydite/client';
import { routes } from './routes.tsx';
import './styles.css';

mountApp({
  app: 'desk',
  roleWord: 'Desk',
  basename: '/desk',
  nav: [
    { to: '/', label: 'Deals', end: true, role: 'operator' },
    { to: '/', label: 'Requests', end: true, role: 'assayer' },
    { to: '/lots', label: 'Lots', role: 'operator' },
    { to: '/members', label: 'Members', role: 'operator' },
    { to: '/effects', label: 'Outbox and jobs', role: 'operator' },
    { to: '/ledger', label: 'Ledger check', role: 'operator' },
  ],
  routes,
});
