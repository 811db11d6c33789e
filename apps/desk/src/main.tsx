import { mountApp } from '@lydite/client';
import { routes } from './routes.tsx';
import './styles.css';

mountApp({
  app: 'desk',
  roleWord: 'Desk',
  basename: '/desk',
  nav: [
    { to: '/', label: 'Deals', end: true },
    { to: '/lots', label: 'Lots' },
    { to: '/members', label: 'Members' },
    { to: '/effects', label: 'Outbox and jobs' },
    { to: '/ledger', label: 'Ledger check' },
  ],
  routes,
});
