// What the product is measured beside: one Express route that parses the same request and sends an answer of the same size.
const express = require('express');

const answer = JSON.parse(process.env.ANSWER ?? '{}');
const app = express();
app.use(express.json({ limit: '1mb' }));
app.post('/api/v1/evaluations', (request, response) => {
  response.json(request.body.input ? answer : null);
});
app.listen(Number(process.env.PORT), '127.0.0.1', () => process.send?.('ready'));
process.once('disconnect', () => process.exit(0));
