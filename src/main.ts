import './styles/fonts.css';
import { PiniaColada } from '@pinia/colada';
import { createPinia } from 'pinia';
import { createApp } from 'vue';
import App from './App.vue';
import { onSignedOut } from './api/http.ts';
import { createAppVuetify } from './plugins/vuetify.ts';
import { createAppRouter } from './router/index.ts';
import { useSessionStore } from './stores/session.ts';
import './styles/base.css';
import './styles/office.css';
import './styles/components.css';

const pinia = createPinia();
const router = createAppRouter();
createApp(App).use(pinia).use(PiniaColada).use(createAppVuetify()).use(router).mount('#app');

onSignedOut(() => {
  const session = useSessionStore(pinia);
  if (!session.me) return;
  session.forget();
  const { fullPath } = router.currentRoute.value;
  void router.push({ name: 'sign-in', query: { to: fullPath } });
});
