# What each index holds for and how far it is trusted; limits of Great Britain.
bluecone switch g20 g25 --working | sed -n "/^Working/,/^Heat input/p"
