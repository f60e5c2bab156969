# make start runs the product, make test checks everything. Also: make -C FOLDER ... from elsewhere.
SHELL := /bin/bash
.SHELLFLAGS := -euo pipefail -c
MAKEFLAGS += --no-print-directory
.DEFAULT_GOAL := help
.PHONY: help start stop dev test bench shots clean node packages postgresql browser build

help:
	@echo 'make start    install, build, migrate, load the demonstration, run; prints the address. PORT= and HOST= as wished'
	@echo 'make stop     stop the product and its database'
	@echo 'make dev      the same in the foreground, rebuilt as files change'
	@echo 'make test     types, lint, format, build, all tests'
	@echo 'make bench    measurements beside their aims; ONLY=name for one'
	@echo 'make shots    pictures of every page, in shots/'
	@echo 'make clean    remove what was built and installed; with DATA=1 also the database'

start: node postgresql packages build
	@backend/scripts/product.sh start

stop:
	@backend/scripts/product.sh stop

dev: node postgresql packages build
	@backend/scripts/product.sh dev

test: node browser packages
	@node .ci/test.mjs

bench: node browser packages build
	@node backend/bench/run.cjs

shots: node browser packages build
	@rm -rf shots
	@SHOTS=all node_modules/.bin/jest --selectProjects browser --testPathPatterns frontend/e2e/pages

clean: stop
	@if [ "$(DATA)" = 1 ]; then database/scripts/cluster.sh remove .data; else echo 'The database is kept; make clean DATA=1 removes it too.'; fi
	@rm -rf node_modules */node_modules */dist */dist-* .run shots coverage .eslintcache
	@find . -name '*.tsbuildinfo' -delete

node:
	@command -v node >/dev/null || { echo 'Node.js is missing: version 20.19 or newer is needed.' >&2; exit 1; }
	@node -e 'const [a, b] = process.versions.node.split("."); process.exit(a > 20 || (a == 20 && b >= 19) ? 0 : 1)' || \
	  { echo "Node.js 20.19 or newer is needed; this is $$(node -v)." >&2; exit 1; }

postgresql: node
	@database/scripts/debian.sh postgresql

browser: node
	@database/scripts/debian.sh postgresql chromium poppler-utils

packages: node
	@node .ci/packages.mjs

build: packages
	@node .ci/prune.mjs
	@node_modules/.bin/tsc -b backend
	@$(MAKE) -s frontend/dist/index.html

# Folders are among the sources, so that a file taken out is noticed too. The old build is served until the new one stands.
frontend/dist/index.html: $(shell find frontend/src frontend/public common/src -not -name '*.spec.ts*' 2>/dev/null) \
    $(wildcard frontend/index.html frontend/vite.config.ts frontend/package.json package-lock.json)
	@echo 'Building the pages'
	@cd frontend && ../node_modules/.bin/vite build --logLevel warn --outDir dist-next --emptyOutDir
	@rm -rf frontend/dist && mv frontend/dist-next frontend/dist && touch frontend/dist/index.html
