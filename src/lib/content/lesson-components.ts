import type { Component } from 'svelte';

/**
 * The lessons' texts as components, each in a chunk of its own. Apart from the catalogue, because
 * this goes to the browser and the catalogue (questions with their keys) never does.
 */
export const lessonComponents = import.meta.glob<{ default: Component }>(
	'/lessons/courses/*/*/lesson.svx'
);
