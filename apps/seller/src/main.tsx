import { mountApp } from '@lydite/client';
import { routes } from './routes.tsx';
import './styles.css';

mountApp({
  app: 'seller',
  roleWord: 'Seller',
  basename: '/sell',
  nav: [
    { to: '/lots', label: 'My lots' },
    { to: '/deals', label: 'Deals' },
    { to: '/payouts', label: 'Payouts' },
  ],
  routes,
});
