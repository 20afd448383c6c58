# Every quantity with unit, meaning and method.
bluecone list quantities
