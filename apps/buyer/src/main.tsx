import { mountApp } from '@lydite/client';
import { routes } from './routes.tsx';
import './styles.css';

mountApp({
  app: 'buyer',
  roleWord: 'Buyer',
  basename: '/',
  nav: [
    { to: '/', label: 'Lots', end: true },
    { to: '/bids', label: 'My bids' },
    { to: '/deals', label: 'Deals' },
    { to: '/terms', label: 'My terms' },
  ],
  routes,
});
