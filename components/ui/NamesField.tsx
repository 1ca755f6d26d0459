"use client";

import clsx from "clsx";
import { useId, useRef, useState, type KeyboardEvent } from "react";
import { Button, ComboBox, Input, ListBox, Popover } from "react-aria-components";
import { Field, fieldBox, type FieldTexts } from "./Field";
import { dropList, inputBox } from "./field-style";
import { Icon } from "./Icon";
import type { Option } from "./option";
import { OptionLine } from "./OptionLine";

export type NameChoice = { name: string; says: string };

export type NamesFieldProps = FieldTexts & {
  names: readonly string[];
  onChange: (names: string[]) => void;
  /** What is known and can be picked; anything else can be typed. */
  choices: readonly NameChoice[];
  placeholder?: string;
};

const SHOWN = 40;

/** Several short names, picked from what is known or typed: Enter or a comma adds one, Backspace takes the last one back. */
export function NamesField({ names, onChange, choices, placeholder, ...texts }: NamesFieldProps) {
  const { label, description, error, isLabelHidden, className } = texts;
  const [text, setText] = useState("");
  /** The box begins anew after each name: else its list opens again over the names when the text is emptied. */
  const [round, setRound] = useState(0);
  const latest = useRef("");
  const listId = useId();
  const type = (typed: string) => {
    latest.current = typed;
    setText(typed);
  };
  const add = (typed: string) => {
    const fresh = typed
      .split(/[,;]/)
      .map((one) => one.trim())
      .filter((one) => one !== "" && !names.includes(one));
    if (fresh.length > 0) onChange([...names, ...new Set(fresh)]);
    type("");
  };
  const addAndGoOn = (typed: string) => {
    add(typed);
    setRound(round + 1);
  };
  const takeOut = (name: string) => onChange(names.filter((one) => one !== name));
  const found = choices
    .filter(({ name, says }) => !names.includes(name) && fits(text, name, says))
    .slice(0, SHOWN)
    .map(({ name, says }) => ({ id: name, label: name, ...(says === "" ? {} : { description: says }) }));

  function onKeyDown(event: KeyboardEvent<HTMLInputElement>) {
    const isPicking = event.currentTarget.getAttribute("aria-activedescendant");
    if ((event.key === "Enter" || event.key === ",") && text.trim() !== "" && !isPicking) {
      event.preventDefault();
      event.stopPropagation();
      addAndGoOn(text);
    } else if (event.key === "Backspace" && text === "") {
      const last = names.at(-1);
      if (last !== undefined) takeOut(last);
    }
  }

  return (
    <div className={clsx("flex min-w-0 flex-col gap-2", className)}>
      <ComboBox
        key={round}
        autoFocus={round > 0}
        items={found}
        value={null}
        onChange={(key) => {
          if (key !== null) addAndGoOn(String(key));
        }}
        inputValue={text}
        onInputChange={type}
        onBlur={() => add(latest.current)}
        allowsCustomValue
        allowsEmptyCollection={false}
        menuTrigger="input"
        isInvalid={Boolean(error)}
        validationBehavior="aria"
        className={fieldBox()}
      >
        <Field {...{ label, description, error, isLabelHidden }}>
          <span className="relative flex">
            <Input
              placeholder={placeholder}
              onKeyDownCapture={onKeyDown}
              aria-describedby={names.length > 0 ? listId : undefined}
              autoComplete="off"
              spellCheck="false"
              className={clsx(inputBox, "mono pr-10 text-[0.9375rem]")}
            />
            <Button className="absolute inset-y-1 right-1 flex w-8 items-center justify-center rounded text-ink-soft hover:bg-ink/8">
              <Icon name="chevron-down" />
            </Button>
          </span>
          <Popover offset={4} className={dropList}>
            <ListBox<Option> className="max-h-72 outline-none">{(option) => <OptionLine option={option} />}</ListBox>
          </Popover>
        </Field>
      </ComboBox>
      {names.length > 0 && (
        <ul id={listId} aria-label={`${label}, chosen`} className="flex flex-wrap gap-1.5">
          {names.map((name) => (
            <li
              key={name}
              className="mono flex min-h-8 items-center gap-0.5 rounded border border-rule-strong bg-raised pl-2 text-sm"
            >
              {name}
              <button
                type="button"
                aria-label={`Take ${name} out`}
                onClick={() => takeOut(name)}
                className="flex size-8 items-center justify-center rounded text-ink-soft hover:bg-ink/8 hover:text-ink"
              >
                <Icon name="close" size={11} />
              </button>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}

function fits(text: string, name: string, says: string): boolean {
  const plain = (one: string) => one.toLowerCase().replace(/\s+/g, "");
  const wanted = plain(text);
  return wanted === "" || plain(name).includes(wanted) || plain(says).includes(wanted);
}
