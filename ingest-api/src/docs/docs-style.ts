/** The product's own look for the API docs: paper, ink, ruled lines, copper for what can be acted on; day and night. */
export const docsStyle = `
:root { color-scheme: light dark; --paper:#F2F3EC; --sheet:#FCFDF8; --ink:#1E2A2F; --faded:#566369; --rule:#D3D6CB; --edge:#7F8478; --copper:#A84B12; --on-copper:#FFFDF8; --note:#234A80; --pass:#0B6B66; --fail:#86103C; --unproven:#6E6600; }
@media (prefers-color-scheme: dark) { :root { --paper:#12181B; --sheet:#1A2226; --ink:#E9E4D8; --faded:#A3ADB0; --rule:#2E393E; --edge:#65747B; --copper:#E08A4C; --on-copper:#12181B; --note:#7DAEE8; --pass:#63D2C4; --fail:#E8697F; --unproven:#EBD76A; } }
body { background: var(--sheet); margin: 0; }
.swagger-ui .topbar { display: none; }
.swagger-ui, .swagger-ui * { border-radius: 0 !important; box-shadow: none !important; text-shadow: none !important; }
.swagger-ui, .swagger-ui .info *, .swagger-ui .opblock-tag, .swagger-ui table *, .swagger-ui .opblock *, .swagger-ui .model *, .swagger-ui label, .swagger-ui section.models * { font-family: system-ui, sans-serif; color: var(--ink); }
.swagger-ui code, .swagger-ui pre, .swagger-ui pre *, .swagger-ui .opblock-summary-path *, .swagger-ui .prop-type, .swagger-ui .parameter__name, .swagger-ui .response-col_status { font-family: ui-monospace, monospace !important; }
.swagger-ui .info .title { font-size: 28px; }
.swagger-ui .info .title small { background: none !important; padding: 0; }
.swagger-ui .info .title small pre { color: var(--faded); padding: 0; }
.swagger-ui code, .swagger-ui .info code { background: var(--paper) !important; color: var(--ink) !important; font-weight: 400; }
.swagger-ui a, .swagger-ui a.nostyle:hover { color: var(--copper) !important; text-decoration: underline; }
.swagger-ui a.nostyle { color: var(--ink) !important; text-decoration: none; }
.swagger-ui .scheme-container { background: var(--sheet); border-block: 1px solid var(--rule); padding: 16px 0; }
.swagger-ui .opblock-tag { border-bottom: 2px solid var(--ink); font-size: 20px; }
.swagger-ui .opblock-tag small, .swagger-ui .opblock-summary-description { color: var(--faded) !important; }
.swagger-ui .opblock, .swagger-ui .opblock .opblock-summary, .swagger-ui .opblock .opblock-section-header { background: var(--sheet) !important; border-color: var(--rule) !important; }
.swagger-ui .opblock { border-width: 0 0 1px; margin: 0; }
.swagger-ui .opblock .opblock-summary-method { background: none !important; border: 1px solid var(--edge); color: var(--ink); min-width: 72px; font-family: ui-monospace, monospace; }
.swagger-ui .btn, .swagger-ui select, .swagger-ui input, .swagger-ui textarea { background: var(--sheet); border: 1px solid var(--edge); color: var(--ink); }
.swagger-ui .btn.authorize, .swagger-ui .btn.execute { background: var(--copper); border-color: var(--copper); }
.swagger-ui .btn.authorize, .swagger-ui .btn.authorize span, .swagger-ui .btn.execute { color: var(--on-copper); }
.swagger-ui .btn.authorize svg { fill: var(--on-copper); }
.swagger-ui svg { fill: var(--ink); }
.swagger-ui pre, .swagger-ui .highlight-code, .swagger-ui .microlight { background: var(--paper) !important; }
.swagger-ui pre *, .swagger-ui .microlight * { color: var(--ink) !important; }
.swagger-ui section.models, .swagger-ui .model-container, .swagger-ui .model-box, .swagger-ui .models-control { background: var(--sheet) !important; border-color: var(--rule) !important; }
.swagger-ui table thead tr td, .swagger-ui table thead tr th { border-bottom: 1px solid var(--ink); }
.swagger-ui .dialog-ux .modal-ux, .swagger-ui .dialog-ux .modal-ux-header { background: var(--sheet); border: 1px solid var(--edge); }
.swagger-ui .parameter__name.required::after, .swagger-ui .prop-format { color: var(--fail) !important; }
`;
