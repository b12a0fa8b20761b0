import '@/styles/nonceStyles.ts'
import '@/styles/fonts.css'
import '@/styles/tokens.css'
import '@/styles/base.css'
import '@/styles/print.css'
import { PiniaColada } from '@pinia/colada'
import { createPinia } from 'pinia'
import { createApp } from 'vue'
import { router } from '@/router/index.ts'
import App from './App.vue'

createApp(App)
  .use(createPinia())
  // Pages show what they have at once and read again when they are opened; ten seconds is one look around.
  .use(PiniaColada, { queryOptions: { staleTime: 10_000 } })
  .use(router)
  .mount('#app')
