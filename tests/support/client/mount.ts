import { PiniaColada } from '@pinia/colada';
import { mount, type VueWrapper } from '@vue/test-utils';
import { createPinia, setActivePinia } from 'pinia';
import { defineComponent, h, type Component } from 'vue';
import { createMemoryHistory, createRouter, type RouteRecordRaw } from 'vue-router';
import { createVuetify } from 'vuetify';
import { VApp } from 'vuetify/components';

interface Options {
  props?: Record<string, unknown>;
  /** Routes beside the catch-all; links need theirs by name. */
  routes?: RouteRecordRaw[];
  /** Where the person is, e.g. "/families/12". */
  at?: string;
}

const nowhere = defineComponent({ render: () => null });

/**
 * Mounts a component inside an application with stores, router and Vuetify, attached to the document.
 * Components are imported by the files that use them, as in the build.
 */
export async function mountInApp(component: Component, options: Options = {}): Promise<VueWrapper> {
  const pinia = createPinia();
  setActivePinia(pinia);
  const router = createRouter({
    history: createMemoryHistory(),
    routes: [...(options.routes ?? []), { path: '/:rest(.*)*', component: nowhere }],
  });
  await router.push(options.at ?? '/');
  await router.isReady();
  const wrapper = mount(
    defineComponent({ render: () => h(VApp, null, { default: () => h(component, options.props ?? {}) }) }),
    { attachTo: document.body, global: { plugins: [pinia, PiniaColada, router, createVuetify()] } },
  );
  return wrapper;
}
