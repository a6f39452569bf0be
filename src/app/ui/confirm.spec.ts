import { OverlayContainer } from '@angular/cdk/overlay';
import { ApplicationRef } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Confirm } from './confirm';

async function open() {
  const answer = TestBed.inject(Confirm).ask({
    title: 'Remove the token "bench-2"?',
    text: 'Uploads stop at once.',
    action: 'Remove the token',
    name: 'bench-2',
  });
  await TestBed.inject(ApplicationRef).whenStable();
  const overlay = TestBed.inject(OverlayContainer).getContainerElement();
  const button = (text: string) =>
    [...overlay.querySelectorAll('button')].find(({ textContent }) => textContent?.includes(text)) as HTMLButtonElement;
  return { answer, overlay, button };
}

it('lets a destructive act through only after its name was typed', async () => {
  const { answer, overlay, button } = await open();
  expect(button('Remove').disabled).toBe(true);
  const field = overlay.querySelector('input') as HTMLInputElement;
  field.value = 'bench-2';
  field.dispatchEvent(new Event('input'));
  await TestBed.inject(ApplicationRef).whenStable();
  expect(button('Remove').disabled).toBe(false);
  button('Remove').click();
  await expect(answer).resolves.toBe(true);
});

it('answers no when it is closed', async () => {
  const { answer, button } = await open();
  button('Keep it').click();
  await expect(answer).resolves.toBe(false);
});
