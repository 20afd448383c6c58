# the limits of a bundled specification
bluecone contract us-tariff-2008
