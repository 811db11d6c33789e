import { mountApp } from '@lydite/client';
import { routes } from './routes.tsx';
import './styles.css';

mountApp({ app: 'desk', roleWord: 'Desk', basename: '/desk', nav: [{ to: '/', label: 'Members', end: true }], routes });
