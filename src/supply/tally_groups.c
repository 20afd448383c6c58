/* SPDX-License-Identifier: MIT */
/* tally_groups.c - a sorted list of groups; the last one is looked at first, since time goes on. */
#include "supply/tally_groups.h"

#include <stdlib.h>
#include <string.h>

#define FIRST_ROOM 64

void tally_groups_close(tally_groups *s)
{
    for (size_t i = 0; i < s->count; i++)
        free(s->groups[i]);
    free(s->groups);
    s->groups = NULL;
    s->count = s->room = 0;
}

/* The first group that is not before the key. */
static size_t find(const tally_groups *s, int64_t key)
{
    size_t low = 0;
    size_t high = s->count;

    if (s->count > 0 && s->groups[s->count - 1]->key < key)
        return s->count;
    while (low < high) {
        const size_t middle = low + (high - low) / 2;

        if (s->groups[middle]->key < key)
            low = middle + 1;
        else
            high = middle;
    }
    return low;
}

bool tally_groups_have(const tally_groups *s, int64_t key)
{
    const size_t i = find(s, key);

    return i < s->count && s->groups[i]->key == key;
}

static bool make_room(tally_groups *s)
{
    const size_t room = s->room > 0 ? 2 * s->room : FIRST_ROOM;

    if (s->count < s->room)
        return true;
    tally_group **groups = realloc(s->groups, room * sizeof(void *));

    if (!groups)
        return false;
    s->groups = groups;
    s->room = room;
    return true;
}

tally_group *tally_groups_take(tally_groups *s, int64_t key)
{
    const size_t i = find(s, key);

    if (i < s->count && s->groups[i]->key == key)
        return s->groups[i];
    if (!make_room(s))
        return NULL;
    tally_group *g = tally_group_open(s->figures, key);

    if (!g)
        return NULL;
    memmove(s->groups + i + 1, s->groups + i, (s->count - i) * sizeof(void *));
    s->groups[i] = g;
    s->count++;
    return g;
}

/* Times are not before 1970: a key is not negative. */
void tally_groups_halve(tally_groups *s)
{
    size_t kept = 0;

    for (size_t i = 0; i < s->count; i++) {
        tally_group *g = s->groups[i];

        g->key /= 2;
        if (kept > 0 && s->groups[kept - 1]->key == g->key) {
            tally_group_join(s->groups[kept - 1], g, s->figures);
            free(g);
        } else {
            s->groups[kept++] = g;
        }
    }
    s->count = kept;
}
